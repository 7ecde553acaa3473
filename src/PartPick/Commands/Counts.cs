using PartPick.Values;

namespace PartPick.Commands;

/// <summary>Reads options that are a number of lines.</summary>
internal static class Counts
{
    /// <summary>The number, one or more; null where the option was not given.</summary>
    public static int? Read(string? text, string option)
    {
        if (text is null)
        {
            return null;
        }

        double count = CommandFailure.Unless(ValueText.Parse(text, Dimension.Count, option));
        return count >= 1
            ? (int)count
            : throw new CommandFailure(new Problem(option, "is zero", "a whole number from 1 such as 10"), ExitStatus.WrongInput);
    }
}

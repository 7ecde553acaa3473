using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary>
/// Joins the values of a requirement's option that takes several words into one argument, so that the file that may follow
/// is not taken for one of them: <c>--supply 4.5 5.5 FILE</c>, <c>--allowDisturbance FILE</c>.
/// </summary>
internal static class RequirementArguments
{
    /// <summary>The arguments with such values joined.</summary>
    /// <param name="arguments">The arguments as they came.</param>
    public static IReadOnlyList<string> Gather(IReadOnlyList<string> arguments)
    {
        ArgumentNullException.ThrowIfNull(arguments);
        var gathered = new List<string>();
        for (int i = 0; i < arguments.Count; i++)
        {
            RequirementKey? key = RequirementKeys.All.FirstOrDefault(known => IsOption(arguments[i], known));
            if (key is null or { Shape: RequirementShape.One })
            {
                gathered.Add(arguments[i]);
                continue;
            }

            var values = new List<string>();
            while (i + 1 < arguments.Count && values.Count < MostValues(key) && Belongs(key, arguments[i + 1], values))
            {
                values.Add(arguments[++i]);
            }

            string joined = key.Shape == RequirementShape.Range ? string.Join("..", values) : string.Join(' ', values);
            bool flagAlone = key.Shape == RequirementShape.Flag && values.Count == 0;
            bool nothing = values.Count == 0 && !flagAlone;
            gathered.Add(nothing ? "--" + key.Name : $"--{key.Name}={(flagAlone ? "true" : joined)}");
        }

        return gathered;
    }

    private static bool IsOption(string argument, RequirementKey key) => argument == "--" + key.Name || argument == "--" + key.Hyphenated;

    private static int MostValues(RequirementKey key) => key.Shape switch
    {
        RequirementShape.Flag => 1,
        RequirementShape.Range => 2,
        _ => 4,
    };

    // The first value is taken as it is, so that a wrong one is named in the problem; the others have to look like one.
    private static bool Belongs(RequirementKey key, string argument, List<string> values) => key.Shape switch
    {
        RequirementShape.Flag => argument.ToUpperInvariant() is "TRUE" or "FALSE" or "YES" or "NO",
        _ when argument.StartsWith("--", StringComparison.Ordinal) => false,
        _ when values.Count == 0 => true,
        _ when values[0].Contains("..", StringComparison.Ordinal) || values[0].StartsWith('[') || values[0].StartsWith('{') => false,
        RequirementShape.Range =>
            ValueText.Parse(argument, key.Name == "supply" ? Dimension.Voltage : Dimension.Temperature, key.Name).IsOk,
        _ => CircuitWords.ByWord.ContainsKey(argument.TrimEnd(','))
            || ValueText.Parse(argument.TrimEnd(','), Dimension.Number, key.Name).IsOk,
    };
}

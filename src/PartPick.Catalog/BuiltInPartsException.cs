namespace PartPick.Catalog;

/// <summary>The parts that travel inside the program are wrong: a mistake in the program, not in what the user gave it.</summary>
public sealed class BuiltInPartsException : Exception
{
    /// <summary>Makes the exception.</summary>
    public BuiltInPartsException()
    {
    }

    /// <summary>Makes the exception.</summary>
    /// <param name="message">Which file is wrong, and how.</param>
    public BuiltInPartsException(string message)
        : base(message)
    {
    }

    /// <summary>Makes the exception.</summary>
    /// <param name="message">Which file is wrong, and how.</param>
    /// <param name="inner">What brought it about.</param>
    public BuiltInPartsException(string message, Exception inner)
        : base(message, inner)
    {
    }
}

namespace PartPick.Output;

/// <summary>How a purchase list is written as CSV.</summary>
/// <param name="Delimiter">What stands between the cells: comma, semicolon, tab or bar.</param>
/// <param name="DecimalSign">The decimal sign: point or comma.</param>
/// <param name="Mark">Whether the file begins with a byte order mark.</param>
public sealed record CsvStyle(char Delimiter = ',', char DecimalSign = '.', bool Mark = false);

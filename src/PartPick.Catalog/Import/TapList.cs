using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>The outputs of a counter as lists write them: "4-10, 12-14", "Q4 to Q10", "Q4/Q5/Q6".</summary>
internal static partial class TapList
{
    private const int Most = 62;

    /// <summary>The same stages one by one, "4;5;6"; the cell itself where it is no such list.</summary>
    public static string Written(string cell)
    {
        Match list = List().Match(cell);
        if (!list.Success)
        {
            return cell;
        }

        var stages = new List<int>();
        for (int i = 0; i < list.Groups[1].Captures.Count; i++)
        {
            Match run = Run().Match(list.Groups[1].Captures[i].Value);
            (int first, int last) = (Number(run.Groups[1]), run.Groups[2].Success ? Number(run.Groups[2]) : Number(run.Groups[1]));
            if (last < first || last > Most)
            {
                return cell;
            }

            stages.AddRange(Enumerable.Range(first, last - first + 1));
        }

        return string.Join(';', stages.Select(stage => stage.ToString(CultureInfo.InvariantCulture)));
    }

    private static int Number(Group digits) => int.Parse(digits.Value, NumberStyles.None, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^\s*(?:(Q?\d{1,2}(?:\s*(?:-|–|—|~|\.{2,3}|…|to|bis|à)\s*Q?\d{1,2})?)\s*(?:[;,/&+\s]|and|$)\s*)+$",
        RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex List();

    [GeneratedRegex(@"^Q?(\d+)(?:\D+(\d+))?$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Run();
}

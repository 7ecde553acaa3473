using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Words for the cut and the overtone of a crystal.</summary>
internal static class CrystalWords
{
    private static readonly string[] Fundamental =
        ["fund", "grund", "fonda", "podst", "zaklad", "alap", "perus", "основн", "基频", "基本波", "基波", "temel", "基頻"];

    private static readonly HashSet<string> Third = Set(
        "3 3rd third 3ot 3o 3e 3er 3a 3eme 3th 三 三次 3次 tercer tercero terzo terza troisieme dritter");

    private static readonly HashSet<string> Fifth = Set("5 5th fifth 5ot 5o 5e 5eme 五次 5次 quinto quinta cinquieme funfter");

    private static readonly HashSet<string> Orders = Set(
        "overtone ot t mode at cut oberton partiel harmonique overton boventoon owerton ton armonico armonica sobretono sobretom "
        + "yliaalto ylasavel harm harmonic modo modus tone wave of vibration gt");

    /// <summary>Whether a cell in the place of a load says series resonance.</summary>
    public static bool IsSeries(string cell) => Trade.Words(cell)
        is "s" or "series" or "ser" or "serie" or "serien" or "en serie" or "in serie"
        or "em serie" or "series resonance" or "series resonant" or "serienresonanz" or "sr" or "resonance serie" or "szeregowy"
        or "串联" or "直列"
        or "serieresonantie" or "serieresonans" or "serieresonanz" or "последовательный";

    /// <summary>The cut that a cell names; null for none.</summary>
    public static string? CutOf(string cell) => Trade.Words(cell) switch
    {
        "at" or "at cut" or "at schnitt" or "at切" => "AT",
        "bt" or "bt cut" => "BT",
        "fork" or "tuning fork" or "xy" or "xy cut" or "x cut" or "diapason" or "stimmgabel" or "stemvork" or "stamgaffel"
            or "stemmegaffel" or "diapazon" or "kamerton" or "aanirauta" or "音叉" or "камертон" => "fork",
        _ => null,
    };

    /// <summary>The overtone that a cell names, 1 for the fundamental; null for none.</summary>
    public static int? OvertoneOf(string cell)
    {
        string words = Trade.Words(cell);
        string[] told = [.. words.Split(' ').Where(word => !Orders.Contains(word))];
        return words is "f" || (told.Length > 0 && told.All(IsFundamental)) ? 1
            : told.Length > 0 && told.All(Third.Contains) ? 3
            : told.Length > 0 && told.All(Fifth.Contains) ? 5
            : null;
    }

    /// <summary>Reads one of the two into a draft; gives what is wrong, or null.</summary>
    public static string? Read(string field, string cell, PartDraft draft)
    {
        if (field == "cut")
        {
            draft.Set("cut", CutOf(cell));
            return draft.Has("cut") ? null : $"{Problem.Quote(cell)} is no cut; fits AT, BT or fork";
        }

        draft.Set("overtone", (double?)OvertoneOf(cell));
        return draft.Has("overtone") ? null : $"{Problem.Quote(cell)} is no overtone; fits fundamental, 3rd or 5th";
    }

    private static bool IsFundamental(string word) =>
        word is "1" or "1st" || Fundamental.Any(start => word.StartsWith(start, StringComparison.Ordinal));

    private static HashSet<string> Set(string words) => new(words.Split(' '), StringComparer.Ordinal);
}

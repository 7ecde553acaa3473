using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Words for the cut and the overtone of a crystal.</summary>
internal static class CrystalWords
{
    /// <summary>Reads one of the two into a draft; gives what is wrong, or null.</summary>
    public static string? Read(string field, string cell, PartDraft draft)
    {
        string words = Trade.Words(cell);
        if (field == "cut")
        {
            draft.Set("cut", words switch
            {
                "at" or "at cut" => "AT",
                "bt" or "bt cut" => "BT",
                "fork" or "tuning fork" or "xy" or "xy cut" or "x cut" => "fork",
                _ => null,
            });
            return draft.Has("cut") ? null : $"{Problem.Quote(cell)} is no cut; fits AT, BT or fork";
        }

        double? overtone = words switch
        {
            "1" or "1st" or "fund" or "fundamental" or "fundamental mode" or "at fundamental" or "grundton" or "fondamental"
                or "f" or "at fund" => 1,
            "3" or "3rd" or "third" or "3rd overtone" or "third overtone" or "3 ot" or "3rd ot" or "3ot" or "3o t" => 3,
            "5" or "5th" or "fifth" or "5th overtone" or "fifth overtone" or "5 ot" or "5th ot" or "5ot" => 5,
            _ => null,
        };
        draft.Set("overtone", overtone);
        return overtone is null ? $"{Problem.Quote(cell)} is no overtone; fits fundamental, 3rd or 5th" : null;
    }
}

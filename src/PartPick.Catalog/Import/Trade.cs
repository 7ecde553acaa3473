using System.Globalization;
using System.Text;

namespace PartPick.Catalog.Import;

/// <summary>
/// The words by which lists of parts name their columns (common practice of distributors and stock systems, from memory), in
/// English, German and French. The first phrases of a field are its surest; all are in the form that <see cref="Words"/> gives.
/// </summary>
internal static class Trade
{
    private static readonly (string Field, string[] Phrases)[] Common =
    [
        ("supplierPart",
        [
            "supplier part", "supplier part number", "supplier part no", "supplier pn", "sku", "order code", "order number", "order no",
            "ordering code", "stock code", "stock no", "stock number", "distributor part number", "distributor part", "catalog number",
            "catalogue number", "catalogue no", "article number", "article no", "article", "item number", "item no", "item code",
            "bestellnummer", "bestell nr", "artikelnummer", "artikel nr", "artnr", "art nr", "reference fournisseur", "code article",
            "reference", "ref", "part number", "part no", "part nr", "partnumber", "pn", "p n", "product code", "product number", "mpn",
            "manufacturer part number", "manufacturer part no", "manufacturer part", "mfr part number", "mfr part no", "mfr part",
            "mfr no", "mfg part number", "mfg pn", "internal pn", "stock item", "part", "item", "code", "number", "no", "nr",
        ]),
        ("description",
        [
            "description", "desc", "product description", "part description", "item description", "bezeichnung", "beschreibung",
            "designation", "details", "text", "name", "part name",
        ]),
        ("supplier", ["supplier", "distributor", "vendor", "source", "lieferant", "fournisseur", "seller"]),
        ("package",
        [
            "package", "package case", "case package", "case", "case size", "size", "size code", "package size", "bauform",
            "gehause", "boitier", "footprint", "housing",
        ]),
        ("currency", ["currency", "curr", "cur", "wahrung", "devise"]),
        ("minimumOrder",
        [
            "minimum order", "minimum order quantity", "min order qty", "min order", "minimum order qty", "minimum quantity",
            "min qty", "min quantity", "moq", "mindestmenge", "mindestbestellmenge", "quantite minimum",
        ]),
        ("multiple", ["multiple", "order multiple", "order multiples", "multiples", "mult", "pack multiple", "vielfaches"]),
        ("stock",
        [
            "stock", "quantity available", "qty available", "available", "available quantity", "availability", "in stock",
            "on hand", "qty on hand", "quantity on hand", "stock qty", "stock quantity", "stock level", "inventory", "lagerbestand",
            "bestand", "lager", "verfugbar", "en stock", "quantite en stock", "free stock", "avail",
        ]),
        ("note", ["note", "notes", "remark", "remarks", "comment", "comments", "bemerkung", "hinweis", "remarque"]),
        ("excluded", ["excluded"]),
        ("prices",
        [
            "prices", "price breaks", "price break", "pricing", "staffelpreise", "preisstaffel", "price list", "price tiers",
            "volume pricing",
        ]),
        ("price",
        [
            "price", "unit price", "price each", "price per unit", "each", "preis", "stuckpreis", "einzelpreis", "prix",
            "prix unitaire", "unit cost", "cost", "list price", "net price",
        ]),
        ("temperature",
        [
            "operating temperature", "operating temperature range", "operating temp", "operating temp range", "temperature range",
            "temp range", "temperature", "temp", "working temperature", "temperaturbereich", "betriebstemperatur",
            "temperature de service", "plage de temperature", "t range",
        ]),
        ("temperatureMin",
        [
            "temperature min", "temperature minimum", "min operating temperature", "operating temperature min", "min temp", "tmin",
            "t min", "temp min", "minimum operating temperature", "lowest temperature", "temp low",
        ]),
        ("temperatureMax",
        [
            "temperature max", "temperature maximum", "max operating temperature", "operating temperature max", "max temp", "tmax",
            "t max", "temp max", "maximum operating temperature", "highest temperature", "temp high",
        ]),
    ];

    private static readonly Dictionary<PartKind, (string Field, string[] Phrases)[]> Own = new()
    {
        [PartKind.Crystal] =
        [
            ("frequency",
            [
                "frequency", "freq", "nominal frequency", "nom freq", "center frequency", "frequenz", "nennfrequenz", "frequence",
                "f0", "fn", "f nom",
            ]),
            ("load",
            [
                "load capacitance", "load cap", "load", "cl", "load capacity", "c load", "cload", "lastkapazitat", "burdekapazitat",
                "capacite de charge", "cap load",
            ]),
            ("shunt",
            [
                "shunt capacitance", "shunt cap", "shunt", "c0", "co", "static capacitance", "parallel capacitance",
                "parallelkapazitat", "capacite shunt", "capacite parallele",
            ]),
            ("motional",
            [
                "motional capacitance", "motional cap", "motional", "c1", "cm", "dynamic capacitance", "dynamische kapazitat",
                "capacite motionnelle",
            ]),
            ("resistance",
            [
                "esr", "equivalent series resistance", "series resistance", "motional resistance", "resistance", "rs", "r1", "rm",
                "esr equivalent series resistance", "serienwiderstand", "resistance serie",
            ]),
            ("driveLevel",
            [
                "drive level", "drive", "dl", "drive power", "max drive level", "belastbarkeit", "niveau d excitation",
                "ansteuerleistung",
            ]),
            ("tolerance",
            [
                "frequency tolerance", "tolerance", "freq tol", "tol", "freq tolerance", "initial tolerance",
                "calibration tolerance", "calibration", "adjustment tolerance", "frequenztoleranz", "toleranz",
                "tolerance en frequence", "make tolerance", "frequency tol", "accuracy",
            ]),
            ("stability",
            [
                "frequency stability", "freq stab", "stability", "stab", "freq stability", "temperature stability",
                "temp stability", "stability over temperature", "temperature drift", "frequenzstabilitat", "stabilitat",
                "stabilite", "frequency stab", "stabilite en frequence", "drift",
            ]),
            ("ageing",
            [
                "ageing", "aging", "ageing first year", "first year ageing", "aging first year", "first year aging", "alterung",
                "vieillissement", "aging per year", "ageing per year",
            ]),
            ("cut", ["cut", "crystal cut", "schnitt"]),
            ("overtone",
            [
                "overtone", "overtone order", "mode", "operating mode", "mode of operation", "oscillation mode", "vibration mode",
                "oberton", "partiel",
            ]),
            ("holder", ["holder", "holder type", "can"]),
        ],
        [PartKind.Capacitor] =
        [
            ("value",
            [
                "capacitance", "value", "cap", "capacity", "nominal capacitance", "cap value", "kapazitat", "wert", "capacite",
                "valeur", "c",
            ]),
            ("toleranceAny", ["tolerance", "tol", "capacitance tolerance", "cap tolerance", "toleranz"]),
            ("dielectric",
            [
                "dielectric", "dielectric type", "dielectric characteristic", "temperature coefficient", "temp coefficient",
                "tempco", "tcc", "temp coeff", "dielektrikum", "dielectrique", "tc", "characteristic", "class",
            ]),
            ("voltage",
            [
                "voltage", "voltage rating", "rated voltage", "voltage rated", "voltage rating dc", "voltage rating vdc", "vdc",
                "volts", "wv", "working voltage", "max voltage", "spannung", "nennspannung", "tension", "tension nominale",
                "voltage dc", "v", "rating",
            ]),
        ],
        [PartKind.Resistor] =
        [
            ("value",
            [
                "resistance", "value", "ohms", "ohm", "res", "resistance value", "resistor value", "widerstand", "wert", "valeur",
                "resistance ohms", "nominal resistance", "r",
            ]),
            ("tolerance", ["tolerance", "tol", "resistance tolerance", "toleranz"]),
        ],
        [PartKind.Transistor] =
        [
            ("beta", ["beta", "current gain", "hfe", "dc current gain", "hfe typ", "gain", "stromverstarkung"]),
            ("betaMin", ["beta min", "hfe min", "dc current gain min", "current gain min", "min hfe"]),
            ("betaMax", ["beta max", "hfe max", "dc current gain max", "current gain max", "max hfe"]),
            ("transitionFrequency", ["transition frequency", "ft", "f t", "frequency transition", "gain bandwidth", "transitfrequenz"]),
            ("currentMax",
            [
                "collector current", "current collector", "ic", "ic max", "current collector ic max", "collector current max",
                "max collector current", "kollektorstrom",
            ]),
            ("voltageMax",
            [
                "vceo", "collector emitter voltage", "voltage collector emitter breakdown", "vce", "vce max",
                "collector emitter voltage max",
            ]),
        ],
    };

    /// <summary>The phrases of the fields of a kind.</summary>
    public static IEnumerable<(string Field, string[] Phrases)> Of(PartKind kind) =>
        Own.TryGetValue(kind, out (string, string[])[]? own) ? own.Concat(Common) : Common;

    /// <summary>A text as lower-case words of letters and digits without accents, one space between: "Freq. Stab" is "freq stab".</summary>
    public static string Words(string text)
    {
        var words = new StringBuilder();
        char last = ' ';
        for (int i = 0; i < text.Length; i++)
        {
            char letter = text[i];
            if (CharUnicodeInfo.GetUnicodeCategory(letter) == UnicodeCategory.NonSpacingMark)
            {
                continue;
            }

            if (!char.IsLetterOrDigit(letter))
            {
                AddSpace(words);
            }
            else
            {
                if (char.IsUpper(letter) && char.IsLower(last) && i + 1 < text.Length && char.IsLower(text[i + 1]))
                {
                    AddSpace(words);
                }

                words.Append(letter == 'ß' ? "ss" : WithoutAccent(char.ToLowerInvariant(letter)).ToString());
            }

            last = letter;
        }

        return words.ToString().Trim();
    }

    // The accented letters of western Europe; the platform's own decomposition needs culture data that the program runs without.
    private static char WithoutAccent(char letter)
    {
        int at = "àáâãäåçèéêëìíîïñòóôõöøùúûüýÿ₀₁₂".IndexOf(letter, StringComparison.Ordinal);
        return at < 0 ? letter : "aaaaaaceeeeiiiinoooooouuuuyy012"[at];
    }

    private static void AddSpace(StringBuilder words)
    {
        if (words.Length > 0 && words[^1] != ' ')
        {
            words.Append(' ');
        }
    }
}

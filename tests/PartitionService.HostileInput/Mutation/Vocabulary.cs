using PartitionService.Core.Catalogue;

namespace PartitionService.HostileInput.Mutation;

/// <summary>Words that the service knows, mixed with words that only look as if.</summary>
public static class Vocabulary
{
    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();

    private static readonly string[] Elements = [.. Catalogue.Elements.Keys];

    private static readonly string[] Slots = [.. Catalogue.Data.Select(row => row.Slot).Distinct()];

    private static readonly string[] Substances =
    [
        "air", "O2", "N2", "Ar", "H2", "H2O", "CO", "CO2", "CH4", "Cl2", "HCl", "SO2", "H2S", "C", "S", "FeO", "Fe2O3", "SiO2", "CaO", "CaCO3", "Al2O3",
        "MgO", "PbO", "SnO2", "Cu2O", "ZnO", "NaCl", "CaF2", "P2O5", "V2O5", "Cu2S", "FeS", "C2H3Cl", "C15H12Br4O2", "Na2CO3", "CuSO4",
    ];

    /// <summary>A text for a field, by its name.</summary>
    public static string For(string field, Dice dice)
    {
        if (dice.OnceIn(4))
            return HostileTexts.Any(dice);
        return field switch
        {
            "formula" => Formula(dice),
            "oxide" => dice.OnceIn(3) ? Formula(dice) : dice.Of(Substances),
            "element" or "solute" => dice.Of(Elements),
            "solvent" => dice.Of(dice.OnceIn(2) ? Catalogue.Solvents : Elements),
            "family" => dice.Of([.. Catalogue.SlagFamilies.Keys]),
            "slot" or "slot_prefix" => Slot(dice),
            _ => HostileTexts.Any(dice),
        };
    }

    /// <summary>A text for a field that the service knows; the name of a case is left to chance.</summary>
    public static string Known(string field, Dice dice) => field switch
    {
        "formula" or "oxide" => dice.OnceIn(2) ? dice.Of(Substances) : dice.Of(Elements),
        "element" or "solute" => dice.Of(Elements),
        "solvent" => dice.Of(Catalogue.Solvents),
        "family" => dice.Of([.. Catalogue.SlagFamilies.Keys]),
        "slot" or "slot_prefix" => dice.Of(Slots),
        _ => "",
    };

    /// <summary>A slot of the catalogue, one that it lacks but allows, or one that it knows nothing of.</summary>
    public static string Slot(Dice dice) => dice.Throw(4) switch
    {
        0 => $"metal/{dice.Of(Catalogue.Solvents)}/{dice.Of(Elements)}",
        1 => $"interaction/{dice.Of(Catalogue.Solvents)}/{dice.Of(Elements)}/{dice.Of(Elements)}",
        _ => dice.Of(Slots),
    };

    /// <summary>A substance that is charged, a formula made up from symbols and brackets, or one that breaks a limit.</summary>
    public static string Formula(Dice dice) => dice.Throw(8) switch
    {
        0 or 1 => dice.Of(Substances),
        2 or 3 => dice.Of(Elements),
        4 => dice.Of(Elements) + Count(dice) + "O" + Count(dice),
        5 => Group(dice, 0),
        6 => new string('(', dice.Throw(120)) + dice.Of(Elements) + new string(')', dice.Throw(120)),
        _ => string.Concat(Enumerable.Range(0, dice.Throw(60)).Select(_ => dice.Of(Elements) + Count(dice))),
    };

    private static string Group(Dice dice, int depth)
    {
        var text = "";
        for (var left = 1 + dice.Throw(3); left > 0; left--)
        {
            text += depth < 8 && dice.OnceIn(2)
                ? (dice.OnceIn(2) ? $"({Group(dice, depth + 1)})" : $"[{Group(dice, depth + 1)}]") + Count(dice)
                : dice.Of(Elements) + Count(dice);
        }

        return text;
    }

    private static string Count(Dice dice) => dice.Throw(12) switch
    {
        0 => "0",
        1 => "1e5",
        2 => "0.000001",
        3 => "1000",
        4 => "99999999999999999999999999",
        5 => ".5",
        6 => "1.5",
        7 => "-2",
        _ => dice.OnceIn(2) ? "" : dice.Throw(9).ToString(System.Globalization.CultureInfo.InvariantCulture),
    };
}

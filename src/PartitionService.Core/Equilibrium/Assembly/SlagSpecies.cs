using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Species of the slag: mononuclear oxides and chlorides, and sulfide by the sulfide capacity.</summary>
/// <param name="family">Slag family.</param>
/// <param name="solvent">Solvent, whose rows decide the state of the metal in the oxidation rows.</param>
/// <param name="temperatureKelvin">Temperature in kelvin.</param>
/// <param name="catalogue">The catalogue.</param>
/// <param name="ledger">Rows and overrides.</param>
internal sealed class SlagSpecies(
    SlagFamily family,
    string solvent,
    double temperatureKelvin,
    ThermochemicalCatalogue catalogue,
    DatumLedger ledger)
{
    private readonly double thermal = PhysicalConstants.GasConstant * temperatureKelvin;

    /// <summary>Constants that depend on the composition of the slag.</summary>
    public SlagTerms Terms { get; } = new(family, temperatureKelvin, catalogue);

    /// <summary>Species of one element; empty where the family has none.</summary>
    public IEnumerable<SpeciesRecord> Create(Element element)
    {
        if (element.Symbol == "P" && PhosphorusByFormula() is { } phosphorus)
        {
            yield return phosphorus;
            yield break;
        }

        foreach (var oxide in SlagIndex.For(catalogue).Oxides(family.Name, element.Symbol, ledger))
        {
            var slot = $"slag/{family.Name}/{oxide}";
            var row = ledger.Select<SlagActivityDatum>(slot);
            var species = row is { OxideState: StandardState.ProductOnly } ? Product(element, slot, row)
                : row is { ChlorinePerMetal: > 0 } ? Chloride(element, slot, row)
                : Oxide(element, slot, oxide, row);
            if (species is not null)
            {
                yield return species;
            }
        }
    }

    /// <summary>Sulfide by the sulfide capacity; null where the family has no formula. A sulfide ion replaces an oxide ion.</summary>
    public SpeciesRecord? Sulfide()
    {
        if (!family.CapacityFormulas.Contains("sosinsky-cs")
            || ledger.Select<CapacityDatum>(SulfideCapacity.Slot) is not { } row)
        {
            return null;
        }

        ledger.Take(row.Slot, row, "log10 of the sulfide capacity", 0, "1", row.SigmaLog10);
        Terms.Add(new SlagTerms.Term(SlagTerms.TermKind.Sulfide, "S", row.Slot, 0, null));
        return new SpeciesRecord(
            "S",
            PhaseKind.Slag,
            null,
            new Dictionary<string, double>(StringComparer.Ordinal) { ["S"] = 1, ["O"] = -1 },
            0,
            null,
            "",
            [row.Slot]);
    }

    /// <summary>Phosphorus in steelmaking slag over iron: the partition formula goes before the activity coefficient.</summary>
    private SpeciesRecord? PhosphorusByFormula()
    {
        if (solvent != "Fe" || !family.CapacityFormulas.Contains("suito-inoue-1995-lp")
            || ledger.Override($"slag/{family.Name}/PO2.5") is not null
            || ledger.Select<InfiniteDilutionDatum>(MetalSpecies.Slot(solvent, "P")) is null
            || ledger.Select<CapacityDatum>(PhosphorusPartition.Slot) is not { } row)
        {
            return null;
        }

        ledger.Take(row.Slot, row, "log10 of the phosphorus partition", 0, "1", row.SigmaLog10);
        Terms.Add(new SlagTerms.Term(SlagTerms.TermKind.Phosphorus, "PO2.5", row.Slot, 0, null));
        return Species("PO2.5", "P", 2.5, 0, 0, 0, null, "", [row.Slot]);
    }

    private SpeciesRecord? Product(Element element, string slot, SlagActivityDatum row)
    {
        if (StateConversion.LnReferenceOverState(element, row.MetalState, temperatureKelvin, catalogue) is not { } conversion)
        {
            return null;
        }

        var given = ledger.Override(slot);
        var value = given ?? row.LnGamma(temperatureKelvin);
        ledger.Take(slot, row, $"ln(K/gamma) of {row.Oxide} in {family.Name} slag", value, "1", row.SigmaLnGamma);
        var perKelvin = (given is null ? row.LnGammaPerKelvin(temperatureKelvin) : 0)
            - StateConversion.LnReferenceOverStatePerKelvin(element, row.MetalState, temperatureKelvin, catalogue);
        return Species(row.Oxide, element.Symbol, row.OxygenPerMetal, 0, value - conversion, perKelvin, null, "", [slot]) with
        {
            HasProductDatum = true,
        };
    }

    private SpeciesRecord? Chloride(Element element, string slot, SlagActivityDatum row)
    {
        var chlorideSlot = $"chloride/{row.Oxide}";
        if (ledger.Select<ChlorideDatum>(chlorideSlot, c => c.ChlorideState == row.OxideState) is not { } formation)
        {
            return null;
        }

        var given = ledger.Override(chlorideSlot);
        var energy = given ?? formation.GibbsEnergy(temperatureKelvin);
        ledger.Take(
            chlorideSlot, formation, $"Gibbs energy of formation of {row.Oxide}(l)", energy, "J/mol", formation.SigmaJoulePerMol);
        var lnGamma = LnGamma(slot, row);
        return Species(
            row.Oxide,
            element.Symbol,
            0,
            row.ChlorinePerMetal,
            (-energy / thermal) - lnGamma,
            -StateConversion.GibbsEnergyOverThermalPerKelvin(energy, given is null ? formation.GibbsEnergyPerKelvin : 0, temperatureKelvin)
                - LnGammaPerKelvin(slot, row),
            lnGamma,
            "pure liquid chloride",
            [slot, chlorideSlot]);
    }

    private SpeciesRecord? Oxide(Element element, string slot, string oxide, SlagActivityDatum? row)
    {
        var oxidationSlot = $"oxidation/{oxide}";
        var state = row?.OxideState
            ?? ledger.Select<OxidationDatum>(oxidationSlot, o => o.OxideState == StandardState.Liquid)?.OxideState
            ?? StandardState.Solid;
        if (Oxidation(element, oxidationSlot, state) is not { } oxidation
            || StateConversion.LnReferenceOverState(element, oxidation.MetalState, temperatureKelvin, catalogue) is not { } conversion)
        {
            return null;
        }

        // An override is stated from the liquid metal, the reference itself.
        var given = ledger.Override(oxidationSlot);
        var energy = given ?? oxidation.GibbsEnergy(temperatureKelvin);
        ledger.Take(
            oxidationSlot,
            oxidation,
            $"Gibbs energy of oxidation to {oxide}({Words(state)}) from {Words(oxidation.MetalState)} {element.Symbol}",
            energy,
            "J/mol",
            oxidation.SigmaJoulePerMol);
        var lnGamma = row is null ? OverrideOnly(slot, oxide) : LnGamma(slot, row);
        var lnK = (-energy / thermal) - (given is null ? conversion : 0) - lnGamma;
        if (row?.Variable is not null && ledger.Override(slot) is null)
        {
            Terms.Add(new SlagTerms.Term(SlagTerms.TermKind.Slope, oxide, slot, lnK, row));
        }

        var perKelvin = -StateConversion.GibbsEnergyOverThermalPerKelvin(
            energy, given is null ? oxidation.GibbsEnergyPerKelvin : 0, temperatureKelvin);
        if (given is null)
        {
            perKelvin -= StateConversion.LnReferenceOverStatePerKelvin(element, oxidation.MetalState, temperatureKelvin, catalogue);
        }

        perKelvin -= row is null ? 0 : LnGammaPerKelvin(slot, row);
        return Species(
            oxide, element.Symbol, oxidation.OxygenPerMetal, 0, lnK, perKelvin, lnGamma, $"pure {Words(state)} oxide", [slot, oxidationSlot]);
    }

    /// <summary>
    /// The oxidation row in the state that the solute's own row has, so that errors of the metal's state cancel in K gamma0; liquid
    /// next, then any other.
    /// </summary>
    private OxidationDatum? Oxidation(Element element, string slot, StandardState oxideState)
    {
        var soluteState = ledger.Select<InfiniteDilutionDatum>(MetalSpecies.Slot(solvent, element.Symbol))?.SoluteState
            ?? StandardState.Liquid;
        return ledger.Select<OxidationDatum>(slot, o => o.OxideState == oxideState && o.MetalState == soluteState)
            ?? ledger.Select<OxidationDatum>(slot, o => o.OxideState == oxideState && o.MetalState == StandardState.Liquid)
            ?? ledger.Select<OxidationDatum>(slot, o => o.OxideState == oxideState);
    }

    private double OverrideOnly(string slot, string oxide)
    {
        var value = ledger.Override(slot) ?? 0;
        ledger.Take(slot, null, $"ln gamma of {oxide} in {family.Name} slag", value, "1", null);
        return value;
    }

    private double LnGamma(string slot, SlagActivityDatum row)
    {
        var quantity = $"ln gamma of {row.Oxide} in {family.Name} slag";
        if (ledger.Override(slot) is { } given)
        {
            ledger.Take(slot, row, quantity, given, "1", null);
            return given;
        }

        var value = row.LnGamma(temperatureKelvin);
        ledger.Take(slot, row, quantity, value, "1", row.SigmaLnGamma);
        return value;
    }

    private double LnGammaPerKelvin(string slot, SlagActivityDatum row) =>
        ledger.Override(slot) is null ? row.LnGammaPerKelvin(temperatureKelvin) : 0;

    private static SpeciesRecord Species(
        string name,
        string element,
        double oxygen,
        double chlorine,
        double lnK,
        double lnKPerKelvin,
        double? lnGamma,
        string standardState,
        string[] slots)
    {
        var atoms = new Dictionary<string, double>(StringComparer.Ordinal) { [element] = 1 };
        if (oxygen > 0)
        {
            atoms["O"] = oxygen;
        }

        if (chlorine > 0)
        {
            atoms["Cl"] = chlorine;
        }

        return new SpeciesRecord(name, PhaseKind.Slag, element, atoms, lnK, lnGamma, standardState, slots)
        {
            LnKPerKelvin = lnKPerKelvin,
        };
    }

    private static string Words(StandardState state) => state switch
    {
        StandardState.Liquid => "liquid",
        StandardState.Solid => "solid",
        StandardState.MonatomicGas => "gaseous",
        StandardState.HalfDiatomicGas => "diatomic gaseous",
        _ => state.ToString(),
    };
}

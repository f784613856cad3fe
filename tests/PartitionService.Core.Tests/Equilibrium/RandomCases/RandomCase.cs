using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.RandomCases;

/// <summary>Random valid cases over the whole declared domain: temperature, pressure, solvents, families, statements, charges, allowances.</summary>
/// <remarks>One seed gives one case; every choice comes from the same source of chance, so a failure is named by its seed.</remarks>
internal sealed class RandomCase
{
    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();

    private static readonly string[] Families = [.. Catalogue.SlagFamilies.Keys.Order(StringComparer.Ordinal)];

    private static readonly string[] Elements =
        [.. Catalogue.Elements.Keys.Where(e => e is not ("O" or "N" or "H" or "Ar" or "F" or "Cl" or "Br" or "I")).Order(StringComparer.Ordinal)];

    private static readonly string[] Oxides =
        [.. Catalogue.Data.OfType<OxidationDatum>().Where(row => row.Preferred).Select(row => row.Oxide).Distinct().Order(StringComparer.Ordinal)];

    private static readonly string[] SlagFormers =
        ["SiO2", "CaO", "Al2O3", "MgO", "FeO", "Fe2O3", "Fe3O4", "Na2O", "ZnO", "PbO", "Cu2O", "MnO", "P2O5", "TiO2", "Fe2SiO4", "CaCO3", "Na2CO3"];

    private static readonly string[] Salts =
        ["NaCl", "KCl", "CaCl2", "MgCl2", "PbCl2", "ZnCl2", "FeCl2", "CuCl", "CaF2", "Na3AlF6", "NaBr", "KBr", "NaI", "Na2SO4", "CaSO4"];

    private static readonly string[] Organics =
        ["C", "C", "CH2", "C8H8", "C2H3Cl", "C15H16O2", "C6H10O5", "C15H12Br4O2", "C2F4", "C3H3N", "C4H4S", "C18H15O4P"];

    private static readonly string[] Sulfides = ["FeS", "FeS2", "Cu2S", "PbS", "ZnS", "Sb2S3", "CuFeS2", "As2S3", "Fe3C", "AlN"];

    private static readonly string[] Gases =
    [
        "air", "O2", "N2", "Ar", "H2", "CO", "CO2", "CH4", "C2H2", "C2H4", "C2H6", "C3H6", "C3H8", "C4H10", "H2O", "Cl2", "HCl", "HBr", "SO2",
        "H2S", "NH3",
    ];

    private readonly Random random;

    private RandomCase(int seed) => random = new Random(seed);

    /// <summary>The case of a seed.</summary>
    public static VesselCase Create(int seed) => new RandomCase(seed).Draw();

    private bool Chance(double probability) => random.NextDouble() < probability;

    private double Between(double low, double high) => low + (random.NextDouble() * (high - low));

    private double Decades(double low, double high) => Math.Pow(10, Between(low, high));

    private T Any<T>(IReadOnlyList<T> list) => list[random.Next(list.Count)];

    private VesselCase Draw()
    {
        var solvent = Any(Catalogue.Solvents);
        var family = Chance(0.75) ? Any(Families) : null;
        var gas = Chance(0.7);
        var charge = Charge(solvent, gas);
        return new VesselCase
        {
            Name = "random",
            TemperatureKelvin = Chance(0.7) ? Between(1000, 2100) : Between(500, 2500),
            PressureAtm = Chance(0.5) ? 1 : Decades(-6, 2),
            Charge = charge,
            Solvent = Chance(0.8) ? solvent : null,
            SlagFamily = family,
            GasAllowed = gas,
            Oxygen = Oxygen(),
            Allowances = Allowances(family, charge),
            Overrides = Overrides(solvent, family),
        };
    }

    private List<ChargeItem> Charge(string solvent, bool gas)
    {
        var charge = new List<ChargeItem> { new(solvent, Chance(0.8) ? Between(10, 1e4) : Decades(-6, 6)) };
        Add(Chance(0.8) ? random.Next(0, 30) : 0, Elements, -7, 2.5);
        Add(Chance(0.6) ? random.Next(0, 8) : 0, SlagFormers, -2, 3.5);
        Add(Chance(0.4) ? random.Next(0, 8) : 0, Oxides, -6, 2.5);
        Add(Chance(0.3) ? random.Next(0, 4) : 0, Salts, -4, 3);
        Add(Chance(0.3) ? random.Next(0, 4) : 0, Organics, -4, 3);
        Add(Chance(0.3) ? random.Next(0, 3) : 0, Sulfides, -4, 3);
        for (var count = Chance(gas ? 0.7 : 0.2) ? random.Next(0, 4) : 0; count > 0; count--)
        {
            charge.Add(new ChargeItem(Any(Gases), Decades(-4, 4), ChargeUnit.NormalCubicMetre));
        }

        if (Chance(0.05))
        {
            charge.Add(new ChargeItem(Any(Elements), 0));
        }

        return charge;

        void Add(int count, string[] formulas, double low, double high)
        {
            for (; count > 0; count--)
            {
                charge.Add(new ChargeItem(Any(formulas), Decades(low, high)));
            }
        }
    }

    private OxygenStatement Oxygen() => random.Next(8) switch
    {
        0 => new OxygenStatement.Pressure(Between(-40, 2)),
        1 => new OxygenStatement.Pressure(Between(-16, -4)),
        2 => new OxygenStatement.CarbonDioxideToMonoxide(Chance(0.7) ? Decades(-4, 4) : Decades(-12, 12)),
        3 => new OxygenStatement.WaterToHydrogen(Chance(0.7) ? Decades(-4, 4) : Decades(-12, 12)),
        4 => new OxygenStatement.MetalOxidePair(
            Any(Oxides), Chance(0.5) ? 1 : Decades(-12, 0), Chance(0.5) ? 1 : Decades(-12, 0)),
        5 => new OxygenStatement.Dissolved(Chance(0.7) ? Decades(-1, 3.5) : Math.Min(50000, Decades(-6, 4.7))),
        _ => new OxygenStatement.Closed(),
    };

    private PracticeAllowances Allowances(string? family, List<ChargeItem> charge)
    {
        if (Chance(0.7))
        {
            return PracticeAllowances.None;
        }

        var typical = family is not null && Catalogue.SlagFamilies[family].TypicalEntrainedMetalMassPercent is not null && Chance(0.3);
        var efficiencies = charge.Select(item => item.Formula).Where(Elements.Contains).Distinct().Where(_ => Chance(0.2))
            .Select(element => new StageEfficiency(element, Chance(0.2) ? random.Next(2) : Between(0, 1))).ToArray();
        return new PracticeAllowances
        {
            MetalInSlagTypical = typical,
            MetalInSlagMassPercent = Chance(0.5) ? Between(0, 90) : 0,
            SlagInMetalMassPercent = Chance(0.3) ? Between(0, 50) : 0,
            MechanicalDustMassFraction = Chance(0.3) ? Between(0, 0.5) : 0,
            StageEfficiencies = efficiencies,
        };
    }

    private List<DatumOverride> Overrides(string solvent, string? family)
    {
        var overrides = new Dictionary<string, DatumOverride>(StringComparer.Ordinal);
        if (Chance(0.8))
        {
            return [];
        }

        for (var count = random.Next(1, 6); count > 0; count--)
        {
            var row = Any(Catalogue.Data);
            var item = random.Next(5) switch
            {
                0 => Metal(solvent, Any(Elements)),
                1 when family is not null => new DatumOverride($"slag/{family}/{Any(Oxides)}", OverrideKind.LnGamma, Between(-8, 8)),
                2 => Interaction(solvent, Any(Elements), Any(Elements)),
                _ when !row.Preferred => null,
                _ => row switch
                {
                    OxidationDatum oxidation => new DatumOverride(
                        row.Slot, OverrideKind.GibbsEnergy, oxidation.GibbsEnergy(1500) + Between(-3e4, 3e4)),
                    GasSpeciesDatum species => new DatumOverride(
                        row.Slot, OverrideKind.GibbsEnergy, species.GibbsEnergy(1500) + Between(-3e4, 3e4)),
                    ChlorideDatum chloride => new DatumOverride(
                        row.Slot, OverrideKind.GibbsEnergy, chloride.GibbsEnergy(1500) + Between(-3e4, 3e4)),
                    InteractionDatum => new DatumOverride(row.Slot, OverrideKind.Epsilon, Between(-50, 50)),
                    InfiniteDilutionDatum or SlagActivityDatum => new DatumOverride(row.Slot, OverrideKind.LnGamma, Between(-8, 8)),
                    _ => null,
                },
            };
            if (item is not null)
            {
                overrides[item.Slot] = item;
            }
        }

        return [.. overrides.Values];

        DatumOverride? Metal(string host, string solute) =>
            host == solute ? null : new DatumOverride($"metal/{host}/{solute}", OverrideKind.LnGamma, Between(-12, 12));

        DatumOverride Interaction(string host, string one, string other)
        {
            var (first, second) = string.CompareOrdinal(one, other) <= 0 ? (one, other) : (other, one);
            return new DatumOverride(
                $"interaction/{host}/{first}/{second}", OverrideKind.Epsilon, Chance(0.9) ? Between(-60, 60) : Between(-1e6, 1e6));
        }
    }
}

using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Slag constants that depend on the slag's own composition: slope terms, sulfide capacity, phosphorus partition.</summary>
/// <param name="family">Slag family; its usual window bounds the composition variables.</param>
/// <param name="temperatureKelvin">Temperature in kelvin.</param>
/// <param name="catalogue">The catalogue.</param>
internal sealed class SlagTerms(SlagFamily family, double temperatureKelvin, ThermochemicalCatalogue catalogue)
{
    private readonly List<Term> terms = [];

    /// <summary>The terms; empty where no constant depends on composition.</summary>
    public IReadOnlyList<Term> All => terms;

    /// <summary>Optical basicity at the last evaluation; null where none was needed.</summary>
    public double? OpticalBasicity { get; private set; }

    /// <summary>One constant that depends on composition.</summary>
    /// <param name="Kind">Which.</param>
    /// <param name="Species">Slag species whose constant it is.</param>
    /// <param name="Slot">Slot of the datum.</param>
    /// <param name="BaseLnK">ln K at the reference of the variable.</param>
    /// <param name="Row">Row with the slope; null for the formulas.</param>
    public sealed record Term(TermKind Kind, string Species, string Slot, double BaseLnK, SlagActivityDatum? Row)
    {
        /// <summary>Index of the species in the assembled case.</summary>
        public int Index { get; set; } = -1;

        /// <summary>Value of the datum at the last evaluation: ln gamma or log10 of a formula.</summary>
        public double DatumValue { get; set; }

        /// <summary>Value of the variable before it was bounded to the family's window; null where it is not defined.</summary>
        public double? Variable { get; set; }

        /// <summary>True where the variable was bounded.</summary>
        public bool Bounded { get; set; }
    }

    /// <summary>Kinds of composition-dependent constants.</summary>
    public enum TermKind
    {
        /// <summary>ln gamma with a slope.</summary>
        Slope,

        /// <summary>Sulfide capacity.</summary>
        Sulfide,

        /// <summary>Phosphorus partition formula.</summary>
        Phosphorus,
    }

    /// <summary>Adds a term.</summary>
    public void Add(Term term) => terms.Add(term);

    /// <summary>ln K of a term at a composition.</summary>
    /// <param name="term">The term.</param>
    /// <param name="slag">Composition of the slag.</param>
    /// <param name="metal">What the phosphorus formula needs of the metal.</param>
    public double LnK(Term term, SlagComposition slag, MetalSide metal) => term.Kind switch
    {
        TermKind.Slope => Slope(term, slag),
        TermKind.Sulfide => Sulfide(term, slag),
        _ => Phosphorus(term, slag, metal),
    };

    /// <summary>What the phosphorus formula needs of the metal and of the solution.</summary>
    /// <param name="LnGammaPhosphorus">ln gamma of P in the metal.</param>
    /// <param name="GramPerMol">Mean mass of the metal, g/mol.</param>
    /// <param name="OxygenPotential">1/2 ln pO2.</param>
    public readonly record struct MetalSide(double LnGammaPhosphorus, double GramPerMol, double OxygenPotential);

    private double Slope(Term term, SlagComposition slag)
    {
        var row = term.Row!;
        term.Variable = slag.Variable(row.Variable!.Value, catalogue.Elements);
        var (low, high) = Window(row.Variable.Value);
        var used = Math.Clamp(term.Variable ?? high, low, high);
        term.Bounded = term.Variable is null || used != term.Variable;
        var delta = row.Slope * (used - row.VariableReference);
        term.DatumValue = row.LnGamma(temperatureKelvin) + delta;
        return term.BaseLnK - delta;
    }

    /// <summary>
    /// ln x = ln C_S - ln(32.06 n) + 1/2 ln pS2 - 1/2 ln pO2 with n mol of cations in 100 g: C_S = (mass % S)(pO2/pS2)^(1/2).
    /// </summary>
    private double Sulfide(Term term, SlagComposition slag)
    {
        OpticalBasicity = slag.OpticalBasicity(catalogue);
        term.DatumValue = SulfideCapacity.Log10(OpticalBasicity ?? 0.6, temperatureKelvin);
        return (term.DatumValue * Math.Log(10))
            - Math.Log(catalogue.Elements["S"].AtomicMassGramPerMol * slag.MonoCationMolPer100Gram(catalogue.Elements));
    }

    /// <summary>
    /// The formula gives L by mass; on moles x(PO2.5)/x_P = 100 L/(n M). The constant is the one that makes the solution meet it, so the
    /// explicit dependence on pO2 drops out: the formula carries it in its iron term.
    /// </summary>
    private double Phosphorus(Term term, SlagComposition slag, MetalSide metal)
    {
        var iron = catalogue.Elements["Fe"].AtomicMassGramPerMol;
        var oxygen = catalogue.Elements["O"].AtomicMassGramPerMol;
        var total = (slag["FeO"] * iron / (iron + oxygen)) + (slag["Fe2O3"] * 2 * iron / ((2 * iron) + (3 * oxygen)));
        term.DatumValue = PhosphorusPartition.Log10(slag, total, temperatureKelvin);
        var perMole = 100 / (slag.MonoCationMolPer100Gram(catalogue.Elements) * metal.GramPerMol);
        return (term.DatumValue * Math.Log(10)) + Math.Log(perMole) - metal.LnGammaPhosphorus - (2.5 * metal.OxygenPotential);
    }

    /// <summary>Range of a variable inside the family's usual composition window.</summary>
    private (double Low, double High) Window(SlagVariable variable)
    {
        SlagComposition Edge(Func<SlagComponent, double> value) =>
            new(family.Components.ToDictionary(c => c.Formula, value, StringComparer.Ordinal), false);

        var typical = Edge(c => c.TypicalMassPercent).Variable(variable, catalogue.Elements) ?? 0;
        double[] corners = variable switch
        {
            SlagVariable.CaOToSiO2MassRatio =>
            [
                Corner(c => c.Formula == "CaO" ? c.LowMassPercent : c.HighMassPercent),
                Corner(c => c.Formula == "CaO" ? c.HighMassPercent : c.LowMassPercent),
            ],
            SlagVariable.IronToSiO2MassRatio =>
            [
                Corner(c => c.Formula == "SiO2" ? c.HighMassPercent : c.LowMassPercent),
                Corner(c => c.Formula == "SiO2" ? c.LowMassPercent : c.HighMassPercent),
            ],
            SlagVariable.CaOMassPercent => [Corner(c => c.LowMassPercent), Corner(c => c.HighMassPercent)],

            // The sum of mole fractions varies by about a fifth inside the steelmaking window.
            _ => [0.8 * typical, 1.2 * typical],
        };
        return (Math.Min(typical, corners[0]), Math.Max(typical, corners[1]));

        double Corner(Func<SlagComponent, double> value) => Edge(value).Variable(variable, catalogue.Elements) ?? typical;
    }
}

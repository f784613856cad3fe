using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>Differentials of the slag constants that depend on the slag's composition; none where the slag is absent.</summary>
internal sealed class SlagFeedback
{
    private readonly VesselAssembly assembly;
    private readonly EquilibriumResponse response;
    private readonly ThermochemicalCatalogue catalogue;
    private readonly IReadOnlyDictionary<string, Element> elements;
    private readonly double temperature;
    private readonly SlagComposition? slag;
    private readonly double total;
    private readonly List<(int Species, string Element)> species = [];

    /// <summary>Prepares the terms of a solution.</summary>
    public SlagFeedback(VesselAssembly assembly, EquilibriumResponse response, ThermochemicalCatalogue catalogue, double temperatureKelvin)
    {
        this.assembly = assembly;
        this.response = response;
        this.catalogue = catalogue;
        elements = catalogue.Elements;
        temperature = temperatureKelvin;
        var problem = assembly.Assembled.Problem;
        var phase = problem.SlagPhase;
        if (phase < 0 || assembly.Terms is null || !(response.PhaseAmount[phase] > 0))
        {
            return;
        }

        var amounts = new List<(string Element, double Mol)>();
        for (var s = 0; s < problem.SpeciesCount; s++)
        {
            if (problem.Phase[s] == phase && assembly.Assembled.Species[s] is { Carried: { } carried } record)
            {
                species.Add((s, record.Name == "FeO1.5" ? record.Name : carried));
                amounts.Add((species[^1].Element, response.Amount(s)));
            }
        }

        amounts.AddRange(assembly.Account.Inert.Elements.Select(e => (e, assembly.Account.Inert[e])));
        slag = WholeOxides.Composition(amounts, elements);
        total = amounts.Sum(entry => Math.Max(0, entry.Mol) * WholeOxides.GramPerMol(entry.Element, elements));
        Terms = [.. assembly.Terms.All.Where(term => term.Index >= 0).Select(Make)];
    }

    /// <summary>The terms.</summary>
    public IReadOnlyList<Term> Terms { get; } = [];

    /// <summary>One constant with its differential.</summary>
    /// <param name="Species">Species whose constant it is.</param>
    /// <param name="Functional">Differential of the constant with respect to the solution.</param>
    /// <param name="PerInertMol">Derivative with respect to each element of the inert part of the slag, per mol.</param>
    /// <param name="PerKelvin">Derivative of its formula with respect to temperature, per kelvin; zero where the record has it.</param>
    /// <param name="PerFormula">Change of the constant per change of ln of its formula: below 1 where sulfide fills the slag.</param>
    internal sealed record Term(
        int Species,
        CompositionFunctional Functional,
        IReadOnlyDictionary<string, double> PerInertMol,
        double PerKelvin,
        double PerFormula);

    private Term Make(SlagTerms.Term term)
    {
        var perPercent = new Dictionary<string, double>(StringComparer.Ordinal);
        var fractions = new List<(int Species, double Weight)>();
        var constants = new List<(int Species, double Weight)>();
        (int Link, double Weight)[] potentials = [];
        var perKelvin = 0.0;
        switch (term.Kind)
        {
            case SlagTerms.TermKind.Slope:
                if (slag is not null && !term.Bounded)
                {
                    Add(perPercent, SlagCompositionGradient.Variable(slag, term.Row!.Variable!.Value, elements), -term.Row.Slope);
                }

                break;
            case SlagTerms.TermKind.Sulfide:
                AddCations(perPercent);
                if (slag is not null)
                {
                    var perBasicity = SulfideCapacity.Log10PerOpticalBasicity(temperature) * Math.Log(10);
                    Add(perPercent, SlagCompositionGradient.OpticalBasicity(slag, catalogue), perBasicity);
                }

                perKelvin = SulfideCapacity.Log10PerKelvin(assembly.Terms!.OpticalBasicity ?? 0.6, temperature) * Math.Log(10);
                break;
            default:
                AddCations(perPercent);
                AddPhosphorus(perPercent);
                AddMetal(fractions, constants);
                potentials = assembly.Assembled.OxygenLink >= 0 ? [(assembly.Assembled.OxygenLink, -2.5)] : [];
                perKelvin = PhosphorusPartition.Log10PerKelvin(temperature) * Math.Log(10);
                break;
        }

        var perMol = PerMol(perPercent);
        var scale = 0.0;
        foreach (var (s, element) in species)
        {
            if (perMol(element) is var slope && slope != 0)
            {
                fractions.Add((s, slope * response.Amount(s)));
                scale += slope * response.Amount(s);
            }
        }

        var inert = assembly.Account.Inert.Elements.ToDictionary(e => e, perMol, StringComparer.Ordinal);
        var functional = new CompositionFunctional
        {
            LnFractions = [.. fractions],
            LnAmount = (assembly.Assembled.Problem.LinkCount + assembly.Assembled.Problem.SlagPhase, scale),
            LnConstants = [.. constants],
            Potentials = potentials,
        };
        var made = new Term(term.Index, functional, inert, perKelvin, 1);
        return term.Kind == SlagTerms.TermKind.Sulfide ? Exchange(made) : made;
    }

    /// <summary>
    /// A sulfide ion takes the place of one of the x_O oxide ions: x_S = K a (1 - x_S/x_O). With s = x_S/x_O the constant k of x_S = k a
    /// has d ln k = (1 - s) d ln K - s (d ln a - d ln x_O).
    /// </summary>
    private Term Exchange(Term formula)
    {
        var assembled = assembly.Assembled;
        var problem = assembled.Problem;
        var slagAmount = response.PhaseAmount[problem.SlagPhase];
        var atoms = problem.LinkAtoms[assembled.OxygenLink];
        var inert = assembly.Account.Inert["O"] / slagAmount;
        var oxides = Enumerable.Range(0, problem.SpeciesCount)
            .Where(s => problem.Phase[s] == problem.SlagPhase && s != formula.Species && atoms[s] != 0).ToArray();
        var oxygen = inert + oxides.Sum(s => atoms[s] * response.Fraction(s));
        var bounded = Math.Max(oxygen, SlagIteration.LeastOxideIons);
        var share = response.Fraction(formula.Species) / bounded;
        var perOxygen = oxygen > SlagIteration.LeastOxideIons ? share / oxygen : 0;
        var functional = formula.Functional;
        var (step, amount) = functional.LnAmount!.Value;
        var perInert = formula.PerInertMol.ToDictionary(
            entry => entry.Key,
            entry => ((1 - share) * entry.Value) + (entry.Key == "O" ? perOxygen / slagAmount : 0),
            StringComparer.Ordinal);
        return formula with
        {
            Functional = new CompositionFunctional
            {
                LnFractions =
                [
                    .. functional.LnFractions.Select(entry => (entry.Species, (1 - share) * entry.Weight)),
                    .. oxides.Select(s => (s, perOxygen * atoms[s] * response.Fraction(s))),
                ],
                LnAmount = (step, ((1 - share) * amount) - (perOxygen * inert)),
                Potentials = [(Array.IndexOf(assembled.Links, "S"), -share), (assembled.OxygenLink, share)],
            },
            PerInertMol = perInert,
            PerKelvin = (1 - share) * formula.PerKelvin,
            PerFormula = 1 - share,
        };
    }

    /// <summary>From independent mass % to mol of an element: the mass % of all oxides together stay 100.</summary>
    private Func<string, double> PerMol(Dictionary<string, double> perPercent)
    {
        if (slag is null || perPercent.Count == 0)
        {
            return _ => 0;
        }

        var mean = perPercent.Sum(entry => entry.Value * slag[entry.Key]) / 100;
        return element => WholeOxides.Of(element).Oxide is { } oxide
            ? (perPercent.GetValueOrDefault(oxide) - mean) * 100 / total * WholeOxides.GramPerMol(element, elements)
            : 0;
    }

    /// <summary>The constant holds -ln n with n mol of cations in 100 g.</summary>
    private void AddCations(Dictionary<string, double> perPercent)
    {
        if (slag is not null)
        {
            Add(perPercent, SlagCompositionGradient.MonoCations(slag, elements), -1 / slag.MonoCationMolPer100Gram(elements));
        }
    }

    private void AddPhosphorus(Dictionary<string, double> perPercent)
    {
        if (slag is null)
        {
            return;
        }

        var shares = SlagCompositionGradient.IronShares(elements);
        var iron = shares.Sum(entry => entry.Share * slag[entry.Oxide]);
        var perIron = PhosphorusPartition.Log10PerIronMassPercent(iron) * Math.Log(10);
        Add(perPercent, slag.MassPercent.Keys.ToDictionary(oxide => oxide, PhosphorusPartition.Log10PerMassPercent), Math.Log(10));
        Add(perPercent, shares.ToDictionary(entry => entry.Oxide, entry => entry.Share), perIron);
    }

    /// <summary>The phosphorus formula needs ln gamma of P in the metal and, with a minus sign, ln of the metal's mean mass.</summary>
    private void AddMetal(List<(int Species, double Weight)> fractions, List<(int Species, double Weight)> constants)
    {
        var metal = Enumerable.Range(0, assembly.Assembled.Species.Length)
            .Where(s => assembly.Assembled.Species[s].Phase == PhaseKind.Metal).ToArray();
        double Weight(int s) => elements[assembly.Assembled.Species[s].Name].AtomicMassGramPerMol;
        var sum = metal.Sum(response.Fraction);
        var mass = metal.Sum(s => response.Fraction(s) * Weight(s));
        foreach (var s in metal)
        {
            fractions.Add((s, -response.Fraction(s) * ((Weight(s) / mass) - (1 / sum))));
            if (assembly.Assembled.Species[s].Name == "P")
            {
                constants.Add((s, 1));
            }
        }
    }

    private static void Add(Dictionary<string, double> target, Dictionary<string, double> source, double factor)
    {
        foreach (var (oxide, value) in source)
        {
            target[oxide] = target.GetValueOrDefault(oxide) + (factor * value);
        }
    }
}

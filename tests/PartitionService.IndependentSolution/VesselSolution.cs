using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.IndependentSolution.Minimising;
using PartitionService.IndependentSolution.Physics;

namespace PartitionService.IndependentSolution;

/// <summary>Solves a vessel from the catalogue's numbers alone: charge book, species, minimisation, slag constants iterated.</summary>
internal sealed class VesselSolution
{
    private readonly Rows rows;
    private readonly ChargeBook charge;
    private readonly SlagConstants? constants;
    private readonly string solvent;
    private readonly Dictionary<Species, double> fixedEnergy;
    private readonly Dictionary<string, SlagActivityDatum> slopes;

    public VesselSolution(VesselCase vessel, ThermochemicalCatalogue catalogue)
    {
        rows = new Rows(catalogue, vessel.TemperatureKelvin);
        charge = new ChargeBook(vessel, rows);
        solvent = vessel.Solvent ?? throw new ArgumentException("the cases here state their solvent", nameof(vessel));
        constants = vessel.SlagFamily is { } family ? new SlagConstants(family, rows) : null;
        var oxygen = OxygenCondition.Read(vessel.Oxygen, rows);
        var present = charge.Atoms.Keys.ToHashSet(StringComparer.Ordinal);
        if (oxygen != new OxygenCondition(null, null))
        {
            present.Add("O");
        }

        var species = SpeciesBook.Create(vessel, solvent, present, charge.InertCations, rows);
        slopes = rows.All<SlagActivityDatum>(r => r.Family == vessel.SlagFamily).DistinctBy(r => r.Oxide).ToDictionary(r => r.Oxide);
        Problem = Build([.. species], oxygen);
        fixedEnergy = Problem.Species.ToDictionary(s => s, s => s.Energy);
        FixedOxygen = oxygen.HalfLnPressure;
        State = new GibbsState(Problem);
        Solve();
    }

    public GibbsProblem Problem { get; }

    public GibbsState State { get; }

    /// <summary>1/2 ln pO2 where it is stated.</summary>
    public double? FixedOxygen { get; }

    /// <summary>Number of rounds over the slag's constants.</summary>
    public int Rounds { get; private set; }

    /// <summary>Potential of an element (ln activity).</summary>
    public double Potential(string element) =>
        element == "O" && FixedOxygen is { } given ? given : State.Potential[Array.IndexOf(Problem.Elements, element)];

    /// <summary>Mol of every species by phase and name.</summary>
    public IEnumerable<(Species Species, double Mol)> Amounts() =>
        Problem.Species.Select((s, index) => (s, State.Amount(Problem, index)));

    private GibbsProblem Build(Species[] species, OxygenCondition oxygen)
    {
        string[] elements =
        [
            .. species.SelectMany(s => s.Atoms.Keys).Distinct().Order(StringComparer.Ordinal)
                .Where(e => e != "O" || oxygen.HalfLnPressure is null),
        ];
        var atoms = elements.Select(e => species.Select(s => s.Atoms.GetValueOrDefault(e)).ToArray()).ToArray();
        var constraint = atoms.Select(row => row.ToArray()).ToArray();
        var amount = elements.Select(e => e == Species.Inert ? charge.InertCations : charge.Atoms.GetValueOrDefault(e)).ToArray();
        if (oxygen.MassFraction is { } fraction)
        {
            // mass of oxygen - w (mass of the metal) = 0
            var row = Array.IndexOf(elements, "O");
            amount[row] = 0;
            constraint[row] =
            [
                .. species.Select(s => s.Phase != Phase.Metal ? 0
                    : ((s.Name == "O" ? 1 : 0) - fraction) * rows.Mass(s.Name) / rows.Mass("O")),
            ];
        }

        int[] metal = [.. Enumerable.Range(0, species.Length).Where(s => species[s].Phase == Phase.Metal)];
        return new GibbsProblem
        {
            Species = species,
            Elements = elements,
            Atoms = atoms,
            Constraint = constraint,
            Amount = amount,
            FixedPart = [.. species.Select(s => (oxygen.HalfLnPressure ?? 0) * s.Atoms.GetValueOrDefault("O"))],
            Excess = new MetalExcess([.. metal.Select(s => species[s].Name)], solvent, rows),
            Metal = metal,
        };
    }

    /// <summary>Minimises, sets the slag's constants at the minimum and repeats until they stay.</summary>
    private void Solve()
    {
        var charged = charge.Atoms.Where(a => constants is not null)
            .Select(a => (Problem.Species.FirstOrDefault(s => s.Phase == Phase.Slag && s.Atoms.ContainsKey(a.Key) && a.Key is not ("O" or "S" or "Cl")), a.Value))
            .Where(a => a.Item1 is not null && a.Item1.Atoms.Keys.First() != solvent).Select(a => (a.Item1!, a.Value));
        var slag = constants?.MassPercent(charged, charge.InertAtoms);
        for (Rounds = 1; Rounds <= 300; Rounds++)
        {
            var change = slag is null ? 0 : SetConstants(slag, Rounds == 1);
            if (Rounds > 1 && change < 1e-11)
            {
                return;
            }

            if (Rounds == 1)
            {
                GibbsMinimiser.Minimise(Problem, State);
            }
            else
            {
                GibbsMinimiser.Polish(Problem, State);
            }

            if (slag is null)
            {
                return;
            }

            slag = constants!.MassPercent(
                Amounts().Where(a => a.Species.Phase == Phase.Slag && a.Species.Name != Species.Inert), charge.InertAtoms);
        }

        throw new InvalidOperationException("the slag's constants did not settle");
    }

    private double SetConstants(Dictionary<string, double> slag, bool first)
    {
        var largest = 0.0;
        foreach (var species in Problem.Species.Where(s => s.Phase == Phase.Slag && s.Name != Species.Inert))
        {
            var next = species.Name switch
            {
                "S" => -constants!.LnSulfide(slag) + (first ? 0 : LnExchange(species, slag)),
                "PO2.5" when fixedEnergy[species] == 0 => Phosphorus(species, slag, first),
                _ => fixedEnergy[species] + constants!.Slope(slopes[species.Name], slag),
            };
            largest = Math.Max(largest, Math.Abs(next - species.Energy));
            species.Energy = next;
        }

        return largest;
    }

    /// <summary>(O) + 1/2 S2 = (S) + 1/2 O2: x_S is K a times the share of oxide ions that is left, 1 - x_S/x_O.</summary>
    private double LnExchange(Species sulfide, Dictionary<string, double> slag)
    {
        var amounts = Amounts().Where(a => a.Species.Phase == Phase.Slag).ToArray();
        var oxide = amounts.Where(a => a.Species != sulfide).Sum(a => a.Species.Atoms.GetValueOrDefault("O") * a.Mol)
            + charge.InertAtoms.GetValueOrDefault("O");
        var total = amounts.Sum(a => a.Mol);
        var dilute = Math.Exp(constants!.LnSulfide(slag) + Potential("S") - Potential("O"));
        return total > 0 ? Math.Log(1 + (dilute * total / oxide)) : 0;
    }

    /// <summary>Energy at which x(PO2.5)/x(P) is what the formula's mass ratio means: 100 L/(cations per 100 g times mean mass of the metal).</summary>
    private double Phosphorus(Species species, Dictionary<string, double> slag, bool first)
    {
        if (first)
        {
            return -40;
        }

        var metal = Amounts().Where(a => a.Species.Phase == Phase.Metal).ToArray();
        var moles = metal.Sum(a => a.Mol);
        var mean = metal.Sum(a => a.Mol * rows.Mass(a.Species.Name)) / moles;
        var dissolved = metal.Single(a => a.Species.Name == "P").Mol / moles;
        var wanted = dissolved * 100 * constants!.PhosphorusRatio(slag) / (constants.Cations(slag) * mean);
        var oxygen = species.Atoms["O"];
        return Potential("P") + (oxygen * Potential("O")) - Math.Log(wanted);
    }
}

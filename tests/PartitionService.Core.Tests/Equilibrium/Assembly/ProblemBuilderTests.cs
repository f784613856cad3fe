using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class ProblemBuilderTests
{
    private static readonly PhaseKind[] MetalAndSlag = [PhaseKind.Metal, PhaseKind.Slag];

    [Fact]
    public void Elements_that_no_species_holds_are_unplaced()
    {
        var built = Build(new() { ["Cu"] = 1, ["W"] = 1 }, 0, null, Metal("Cu"));
        Assert.Equal(["W"], built.Unplaced);
        Assert.Equal(["Cu"], built.Carried);
    }

    /// <summary>Tungsten sits only in an oxide: without oxygen it is stranded, and with it the oxide falls away.</summary>
    [Fact]
    public void An_element_whose_partner_is_missing_is_stranded_too()
    {
        var oxide = Slag("WO3", ("W", 1), ("O", 3));
        Assert.Equal(["W"], Build(new() { ["Cu"] = 1, ["W"] = 1 }, 0, null, Metal("Cu"), oxide).Unplaced);
        Assert.Empty(Build(new() { ["Cu"] = 1, ["W"] = 1, ["O"] = 3 }, 0, null, Metal("Cu"), oxide).Unplaced);
    }

    /// <summary>Zn needs Cl, Cl is held only together with S, and S is not there: one falls after the other.</summary>
    [Fact]
    public void Stranding_goes_on_until_nothing_changes()
    {
        var built = Build(
            new() { ["Cu"] = 1, ["Zn"] = 1, ["Cl"] = 1 }, 0, null, Metal("Cu"), Slag("ZnCl2S", ("Zn", 1), ("Cl", 2), ("S", 1)));
        Assert.Equal(["Cl", "Zn"], built.Unplaced.Order(StringComparer.Ordinal));
    }

    [Fact]
    public void A_phase_that_is_not_allowed_places_nothing() =>
        Assert.Equal(
            ["Ar"],
            Build(
                new() { ["Cu"] = 1, ["Ar"] = 1 }, 0, null, Metal("Cu"), new("Ar", PhaseKind.Gas, "Ar", Atoms(("Ar", 1)), 0, null, "", []))
                .Unplaced);

    [Fact]
    public void A_fixed_potential_brings_oxygen_that_is_not_charged()
    {
        var built = Build(new() { ["Cu"] = 1 }, 0, -9, Metal("Cu"), Slag("CuO0.5", ("Cu", 1), ("O", 0.5)));
        Assert.Equal(["O"], built.Links);
        Assert.Equal(0, built.OxygenLink);
        Assert.Equal([true], built.Problem.LinkFixed);
        Assert.Equal([-9.0], built.Problem.LinkPotential);
    }

    [Fact]
    public void Inert_cations_are_a_component_of_their_own_at_the_end()
    {
        var built = Build(new() { ["Cu"] = 1 }, 2.5, null, Metal("Cu"));
        Assert.Equal(["Cu", AssembledCase.InertName], built.Carried);
        Assert.Equal([1, 2.5], built.Problem.ElementAmount);
        Assert.Contains(built.Species, s => s is { Name: AssembledCase.InertName, Phase: PhaseKind.Slag });
    }

    [Fact]
    public void Species_stand_by_element_then_by_atoms_and_link_only_ones_last()
    {
        var built = Build(
            new() { ["Zn"] = 1, ["Cu"] = 1, ["O"] = 1 },
            0,
            null,
            Slag("Cu2O", ("Cu", 2), ("O", 1)),
            new("O", PhaseKind.Metal, null, Atoms(("O", 1)), 0, 0, "", []),
            Metal("Zn"),
            Metal("Cu"));
        Assert.Equal(["Cu", "Cu2O", "Zn", "O"], built.Species.Select(s => s.Name));
        Assert.Equal([0, 2, 3, 4], built.Problem.GroupStart);
        Assert.Equal([1, 2, 1, 0], built.Problem.Multiplicity[..4]);
        Assert.Equal([0, 1, 0, 1], built.Problem.LinkAtoms[0][..4]);
        Assert.Equal(0, built.SolventSpecies);
        Assert.Equal([2, 3], built.MetalSolutes);
    }

    [Fact]
    public void Arrays_are_padded_with_species_of_nothing()
    {
        var problem = Build(new() { ["Cu"] = 1 }, 0, null, Metal("Cu")).Problem;
        Assert.Equal(EquilibriumProblem.Padding, problem.PaddedCount);
        Assert.All(problem.LnK[1..], value => Assert.Equal(0, Math.Exp(value)));
    }

    [Fact]
    public void Interactions_are_asked_for_only_where_both_are_in_the_metal()
    {
        var asked = new List<string>();
        InteractionIndex.Pair[] pairs = [new("Ag", "Zn", "first"), new("Ag", "Pb", "second"), new("Zn", "Zn", "third")];
        new ProblemBuilder(new Dictionary<string, double> { ["Cu"] = 1, ["Zn"] = 1, ["Ag"] = 1 }, 0, null).Build(
            [Metal("Cu"), Metal("Zn"), Metal("Ag")], MetalAndSlag, "Cu", [1, 1], pairs, pair =>
            {
                asked.Add(pair.Slot);
                return new InteractionTerm(pair.Slot, 1, 0);
            });
        Assert.Equal(["first", "third"], asked);
    }

    private static AssembledCase Build(
        Dictionary<string, double> amounts, double inert, double? oxygen, params SpeciesRecord[] species) =>
        new ProblemBuilder(amounts, inert, oxygen).Build(species, MetalAndSlag, "Cu", [1, 1], [], _ => throw new InvalidOperationException());

    private static SpeciesRecord Metal(string element) =>
        new(element, PhaseKind.Metal, element, Atoms((element, 1)), 0, 0, "pure liquid", []);

    private static SpeciesRecord Slag(string name, params (string Element, double Count)[] atoms) =>
        new(name, PhaseKind.Slag, atoms[0].Element, Atoms(atoms), 0, 0, "", []);

    private static Dictionary<string, double> Atoms(params (string Element, double Count)[] atoms) =>
        atoms.ToDictionary(a => a.Element, a => a.Count);
}

using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.IndependentSolution.Physics;

/// <summary>Own book of what is charged, mol of atoms; what the slag carries as inert is kept apart.</summary>
internal sealed class ChargeBook
{
    private static readonly string[] Linking = ["O", "S", "Cl", "Br", "H", "F", "I"];

    public ChargeBook(VesselCase vessel, Rows rows)
    {
        foreach (var item in vessel.Charge)
        {
            var atoms = item.Formula == "air"
                ? new Dictionary<string, double> { ["N"] = 1.5618, ["O"] = 0.4196, ["Ar"] = 0.0093, ["C"] = 0.0003 }
                : Formula.Atoms(item.Formula);
            var mol = item.Unit == ChargeUnit.NormalCubicMetre
                ? item.Quantity * 101325 / (Rows.GasConstant * 273.15)
                : item.Quantity * 1000 / atoms.Sum(a => a.Value * rows.Mass(a.Key));
            var oxidic = item.Unit == ChargeUnit.Kilogram && !atoms.ContainsKey("C")
                && atoms.Keys.Any(e => e is "O" or "F" or "Cl" or "Br");
            var cation = atoms.Keys.FirstOrDefault(e => !Linking.Contains(e));
            var inert = vessel.SlagFamily is { } family && oxidic && cation is not null
                && (atoms.ContainsKey("F") || !rows.All<SlagActivityDatum>(r => r.Family == family && r.Element == cation).Any());
            foreach (var (element, count) in atoms)
            {
                var book = inert ? InertAtoms : Atoms;
                book[element] = book.GetValueOrDefault(element) + (count * mol);
            }

            InertCations += inert ? atoms[cation!] * mol : 0;
        }
    }

    /// <summary>Atoms that react, mol.</summary>
    public Dictionary<string, double> Atoms { get; } = new(StringComparer.Ordinal);

    /// <summary>Atoms of the inert part of the slag, mol.</summary>
    public Dictionary<string, double> InertAtoms { get; } = new(StringComparer.Ordinal);

    /// <summary>Inert cations, which dilute the slag, mol.</summary>
    public double InertCations { get; }
}

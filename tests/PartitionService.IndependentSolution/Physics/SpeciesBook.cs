using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.IndependentSolution.Physics;

/// <summary>Own joining of the tables into species.</summary>
internal static class SpeciesBook
{
    public static List<Species> Create(VesselCase vessel, string solvent, HashSet<string> elements, double inertCations, Rows rows)
    {
        var species = new List<Species>();
        foreach (var element in elements.Where(e => e != "Ar").Order(StringComparer.Ordinal))
        {
            if (element == solvent)
            {
                species.Add(new Species(element, Phase.Metal, One(element), 0));
            }
            else if (Solute(solvent, element, rows) is { } energy)
            {
                species.Add(new Species(element, Phase.Metal, One(element), energy));
            }
        }

        if (vessel.SlagFamily is { } family)
        {
            AddSlag(species, family, solvent, elements, rows);
            if (inertCations > 0)
            {
                species.Add(new Species(Species.Inert, Phase.Slag, One(Species.Inert), 0));
            }
        }

        if (vessel.GasAllowed)
        {
            // HCN is the one gas with two elements besides O, S, Cl, Br and H; the service leaves it out.
            species.AddRange(rows.All<GasSpeciesDatum>(row => row.Species != "HCN").Select(row => new Species(
                row.Species,
                Phase.Gas,
                row.Atoms.ToDictionary(a => a.Key, a => (double)a.Value),
                rows.Gas(row.Species)!.Value + Math.Log(vessel.PressureAtm))));
        }

        if (elements.Contains("C"))
        {
            species.Add(new Species("C", Phase.Carbon, One("C"), 0));
        }

        species.RemoveAll(s => s.Atoms.Keys.Any(e => e != Species.Inert && !elements.Contains(e)));
        return species;
    }

    /// <summary>ln gamma0 of a solute on the liquid (graphite, half diatomic gas); null without a row.</summary>
    private static double? Solute(string solvent, string element, Rows rows) =>
        rows.Nearest<InfiniteDilutionDatum>(r => r.Solvent == solvent && r.Solute == element) is { } row
            ? row.Constant + (row.InverseTemperatureKelvin / rows.Temperature) + rows.Shift(element, row.SoluteState)
            : null;

    private static void AddSlag(List<Species> species, string family, string solvent, HashSet<string> elements, Rows rows)
    {
        var formulas = rows.Catalogue.SlagFamilies[family].CapacityFormulas;
        var byFormula = solvent == "Fe" && formulas.Contains("suito-inoue-1995-lp");
        foreach (var row in rows.All<SlagActivityDatum>(r => r.Family == family && elements.Contains(r.Element)))
        {
            var atoms = One(row.Element);
            if (row.OxygenPerMetal > 0)
            {
                atoms["O"] = row.OxygenPerMetal;
            }

            if (row.ChlorinePerMetal > 0)
            {
                atoms["Cl"] = row.ChlorinePerMetal;
            }

            if (byFormula && row.Element == "P")
            {
                species.Add(new Species("PO2.5", Phase.Slag, atoms, 0));
            }
            else if (Standard(row, solvent, rows) is { } energy)
            {
                species.Add(new Species(row.Oxide, Phase.Slag, atoms, energy));
            }
        }

        if (elements.Contains("S") && elements.Contains("O") && formulas.Contains("sosinsky-cs"))
        {
            species.Add(new Species("S", Phase.Slag, new Dictionary<string, double> { ["S"] = 1, ["O"] = -1 }, 0));
        }
    }

    /// <summary>(Delta G + mu of the metal's state)/RT + ln gamma of an oxide or chloride, slope terms left out.</summary>
    private static double? Standard(SlagActivityDatum row, string solvent, Rows rows)
    {
        var lnGamma = row.Constant + (row.InverseTemperatureKelvin / rows.Temperature);
        if (row.OxideState == StandardState.ProductOnly)
        {
            return rows.Shift(row.Element, row.MetalState) - lnGamma;
        }

        if (row.ChlorinePerMetal > 0)
        {
            var chloride = rows.Nearest<ChlorideDatum>(c => c.Chloride == row.Oxide && c.ChlorideState == row.OxideState);
            return chloride is null
                ? null
                : ((chloride.EnthalpyJoulePerMol + (chloride.SlopeJoulePerMolKelvin * rows.Temperature)) / rows.Thermal) + lnGamma;
        }

        var soluteState = rows.Nearest<InfiniteDilutionDatum>(r => r.Solvent == solvent && r.Solute == row.Element)?.SoluteState
            ?? StandardState.Liquid;
        OxidationDatum? oxidation = null;
        foreach (var accept in new Func<StandardState, bool>[] { s => s == soluteState, s => s == StandardState.Liquid, _ => true })
        {
            oxidation ??= rows.Nearest<OxidationDatum>(
                o => o.Oxide == row.Oxide && o.OxideState == row.OxideState && accept(o.MetalState));
        }

        return oxidation is null
            ? null
            : ((oxidation.EnthalpyJoulePerMol + (oxidation.SlopeJoulePerMolKelvin * rows.Temperature)) / rows.Thermal)
                + rows.Shift(row.Element, oxidation.MetalState) + lnGamma;
    }

    private static Dictionary<string, double> One(string element) => new(StringComparer.Ordinal) { [element] = 1 };
}

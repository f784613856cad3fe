using PartitionService.Core.Catalogue;

namespace PartitionService.IndependentSolution.Physics;

/// <summary>Own evaluation of the slag's constants that follow its composition: slopes, sulfide capacity, phosphorus formula.</summary>
internal sealed class SlagConstants(string family, Rows rows)
{
    private static readonly Dictionary<string, string> Whole = new(StringComparer.Ordinal)
    {
        ["Al"] = "Al2O3",
        ["As"] = "As2O3",
        ["B"] = "B2O3",
        ["Ba"] = "BaO",
        ["Bi"] = "Bi2O3",
        ["Ca"] = "CaO",
        ["Cr"] = "Cr2O3",
        ["Cu"] = "Cu2O",
        ["Fe"] = "FeO",
        ["K"] = "K2O",
        ["Li"] = "Li2O",
        ["Mg"] = "MgO",
        ["Mn"] = "MnO",
        ["Na"] = "Na2O",
        ["Ni"] = "NiO",
        ["P"] = "P2O5",
        ["Pb"] = "PbO",
        ["Sb"] = "Sb2O3",
        ["Si"] = "SiO2",
        ["Sn"] = "SnO2",
        ["Sr"] = "SrO",
        ["Ti"] = "TiO2",
        ["Zn"] = "ZnO",
    };

    private readonly SlagFamily window = rows.Catalogue.SlagFamilies[family];

    /// <summary>Mass % of whole oxides from mol of slag species and of inert cations.</summary>
    public Dictionary<string, double> MassPercent(IEnumerable<(Species Species, double Mol)> slag, Dictionary<string, double> inertAtoms)
    {
        var mass = new Dictionary<string, double>(StringComparer.Ordinal);
        foreach (var (species, mol) in slag.Where(s => s.Species.Name != "S"))
        {
            var cation = species.Atoms.Keys.First(e => e is not ("O" or "Cl"));
            Add(species.Name == "FeO1.5" ? "Fe2O3" : Whole.GetValueOrDefault(cation), cation, mol);
        }

        foreach (var (element, mol) in inertAtoms)
        {
            Add(Whole.GetValueOrDefault(element), element, mol);
        }

        var total = mass.Values.Sum();
        return total > 0
            ? mass.ToDictionary(m => m.Key, m => 100 * m.Value / total)
            : window.Components.ToDictionary(c => c.Formula, c => c.TypicalMassPercent);

        void Add(string? oxide, string cation, double mol)
        {
            if (oxide is not null && mol > 0)
            {
                mass[oxide] = mass.GetValueOrDefault(oxide) + (mol / Formula.Atoms(oxide)[cation] * rows.FormulaMass(oxide));
            }
        }
    }

    /// <summary>What a slope adds to ln gamma; the variable is held inside the family's window.</summary>
    public double Slope(SlagActivityDatum row, Dictionary<string, double> slag)
    {
        if (row.Variable is not { } variable)
        {
            return 0;
        }

        var typical = Variable(variable, Of(c => c.TypicalMassPercent)) ?? 0;
        var corners = variable switch
        {
            SlagVariable.CaOToSiO2MassRatio => Corners(c => c == "CaO"),
            SlagVariable.IronToSiO2MassRatio => Corners(c => c != "SiO2"),
            SlagVariable.CaOMassPercent => Corners(_ => true),
            _ => [0.8 * typical, 1.2 * typical],
        };
        var high = Math.Max(typical, corners.Max());
        var value = Math.Clamp(Variable(variable, slag) ?? high, Math.Min(typical, corners.Min()), high);
        return row.Slope * (value - row.VariableReference);

        Dictionary<string, double> Of(Func<SlagComponent, double> percent) => window.Components.ToDictionary(c => c.Formula, percent);

        double[] Corners(Func<string, bool> above) =>
        [
            Variable(variable, Of(c => above(c.Formula) ? c.LowMassPercent : c.HighMassPercent)) ?? typical,
            Variable(variable, Of(c => above(c.Formula) ? c.HighMassPercent : c.LowMassPercent)) ?? typical,
        ];
    }

    /// <summary>ln x_S - 1/2 ln pS2 + 1/2 ln pO2 of few sulfide ions: Sosinsky and Sommerville 1986, by optical basicity.</summary>
    public double LnSulfide(Dictionary<string, double> slag)
    {
        double above = 0, below = 0;
        foreach (var (oxide, percent) in slag)
        {
            if (rows.Nearest<OpticalBasicityDatum>(r => r.Oxide == oxide) is { } row)
            {
                var atoms = Formula.Atoms(oxide);
                var anions = percent / rows.FormulaMass(oxide) * (atoms.GetValueOrDefault("O") + (atoms.GetValueOrDefault("F") / 2));
                above += anions * row.OpticalBasicity;
                below += anions;
            }
        }

        var basicity = below > 0 ? above / below : 0.6;
        var log10 = ((22690 - (54640 * basicity)) / rows.Temperature) + (43.6 * basicity) - 25.2;
        return (log10 * Math.Log(10)) - Math.Log(rows.Mass("S") * Cations(slag));
    }

    /// <summary>Mass ratio of phosphorus between slag and iron: Suito and Inoue 1995.</summary>
    public double PhosphorusRatio(Dictionary<string, double> slag)
    {
        double P(string oxide) => slag.GetValueOrDefault(oxide);
        var basicity = P("CaO") + (0.3 * P("MgO")) + (0.6 * P("P2O5")) + (0.2 * P("MnO")) - (0.5 * P("Al2O3")) + (1.2 * P("Na2O"))
            + (0.9 * P("BaO"));
        return Math.Pow(
            10, (0.072 * basicity) + (11570 / rows.Temperature) - 10.52 + (2.5 * Math.Log10(Math.Max(Iron(slag), 0.5))));
    }

    /// <summary>Mol of cations in 100 g.</summary>
    public double Cations(Dictionary<string, double> slag) => slag.Sum(
        oxide => oxide.Value / rows.FormulaMass(oxide.Key) * Formula.Atoms(oxide.Key).Where(a => a.Key != "O").Sum(a => a.Value));

    private double Iron(Dictionary<string, double> slag) =>
        rows.Mass("Fe") * ((slag.GetValueOrDefault("FeO") / rows.FormulaMass("FeO"))
            + (2 * slag.GetValueOrDefault("Fe2O3") / rows.FormulaMass("Fe2O3")));

    private double? Variable(SlagVariable variable, Dictionary<string, double> slag)
    {
        var silica = slag.GetValueOrDefault("SiO2");
        switch (variable)
        {
            case SlagVariable.CaOMassPercent:
                return slag.GetValueOrDefault("CaO");
            case SlagVariable.CaOToSiO2MassRatio:
                return silica > 0 ? slag.GetValueOrDefault("CaO") / silica : null;
            case SlagVariable.IronToSiO2MassRatio:
                return silica > 0 ? Iron(slag) / silica : null;
            default:
                var mol = slag.ToDictionary(s => s.Key, s => s.Value / rows.FormulaMass(s.Key));
                double M(string oxide) => mol.GetValueOrDefault(oxide);
                return ((22 * M("CaO")) + (15 * M("MgO")) + (13 * M("MnO")) + (12 * M("FeO")) - (2 * M("SiO2"))) / mol.Values.Sum();
        }
    }
}

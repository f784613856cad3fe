namespace PartitionService.Core.Tests.Catalogue;

/// <summary>Each rule between rows and tables, provoked by breaking a real row.</summary>
public sealed class CrossTableRefusalTests
{
    [Theory]
    [InlineData("chlorides.csv", "Mg,MgCl2", "nist-janaf-1998", "nist-janaf-1898", "source id 'nist-janaf-1898' is not in sources.csv")]
    [InlineData("elements.csv", "Cu,", "nist-janaf-1998", "nowhere", "source id 'nowhere' is not in sources.csv")]
    [InlineData("slag_families.csv", "soda-alkali", "common-practice", "nowhere", "source id 'nowhere' is not in sources.csv")]
    [InlineData("slag_components.csv", "soda-alkali,SiO2", "common-practice", "nowhere", "source id 'nowhere' is not in sources.csv")]
    [InlineData("infinite_dilution.csv", "Pb,Ag", "Pb,Ag", "Pb,Xe", "element 'Xe' is not in elements.csv")]
    [InlineData("interactions.csv", "Cu,Ag,O", "Ag,O", "Ag,Xe", "element 'Xe' is not in elements.csv")]
    [InlineData("gas_species.csv", "Ar,", "Ar,Ar:1", "Xe,Xe:1", "element 'Xe' is not in elements.csv")]
    [InlineData("solubility_limits.csv", "Pb,Cr:1", "Cr:1", "Xe:1", "element 'Xe' is not in elements.csv")]
    [InlineData("slag_components.csv", "soda-alkali,SiO2", "SiO2", "XeO3", "element 'Xe' is not in elements.csv")]
    [InlineData("slag_components.csv", "soda-alkali,SiO2", "soda-alkali", "soda-ash", "slag family 'soda-ash' is not in slag_families.csv")]
    [InlineData("slag_activities.csv", "soda-alkali,FeO", "soda-alkali", "soda-ash", "slag family 'soda-ash' is not in slag_families.csv")]
    [InlineData("slag_families.csv", "ladle-lime-alumina", "sosinsky-cs", "sosinsky",
        "capacity formula 'sosinsky' is not in capacities.csv")]
    [InlineData("slag_activities.csv", "iron-silicate,FeO1.5", "solid,liquid", "liquid,liquid",
        "FeO1.5 (Liquid) has no row of that state in oxidation.csv or chlorides.csv")]
    [InlineData("slag_activities.csv", "chloride-salt,NaCl", "liquid,liquid", "solid,liquid", "NaCl (Solid) has no row of that state")]
    [InlineData("slag_activities.csv", "iron-silicate,FeO1.5", "solid,liquid", "solid,solid",
        "metal_state must be liquid, except in a product-only row")]
    [InlineData("gas_species.csv", "CO,C:1;O:1,-110642", ",no,", ",yes,", "slot gas/CO has 2 preferred rows, exactly one is allowed")]
    [InlineData("gas_species.csv", "CO,C:1;O:1,-105338.3", ",yes,", ",no,", "slot gas/CO has no preferred row")]
    [InlineData("slag_activities.csv", "iron-silicate,PbO,liquid,liquid,-1.963", ",no,", ",yes,",
        "slot slag/iron-silicate/PbO has 2 preferred rows")]
    [InlineData("infinite_dilution.csv", "Cu,Ag,liquid,-0.160075", ",no,", ",yes,",
        "slot metal/Cu/Ag: preferred rows overlap in temperature")]
    [InlineData("infinite_dilution.csv", "Cu,Ag,liquid,-0.254417", ",yes,", ",no,", "slot metal/Cu/Ag has no preferred row")]
    [InlineData("oxidation.csv", "Bi,BiO1.5,liquid,liquid,-291341", ",no,", ",yes,",
        "slot oxidation/BiO1.5: preferred rows overlap in temperature")]
    [InlineData("interactions.csv", "Fe,Al,Al,5.52", ",no,", ",yes,", "slot interaction/Fe/Al/Al: preferred rows overlap in temperature")]
    [InlineData("solubility_limits.csv", "Pb,Cu:1,2.72", ",no,", ",yes,", "slot solubility/Pb/Cu: preferred rows overlap in temperature")]
    [InlineData("capacities.csv", "mn-partition-basic", "mn-partition-basic", "cr-partition", "slot capacity/cr-partition stands twice")]
    [InlineData("optical_basicities.csv", "Al2O3,0.605", "slag-atlas", "ghosh", "slot optical-basicity/Al2O3 has set 'ghosh' twice")]
    [InlineData("optical_basicities.csv", "Al2O3,0.61,pnnl", ",no,", ",yes,", "slot optical-basicity/Al2O3 has 2 preferred rows")]
    [InlineData("optical_basicities.csv", "Ag2O,", ",no,", ",yes,", "only a row of the set 'mills' may be preferred")]
    public void Catalogue_is_refused_at_a_row_of_the_file(string file, string linePrefix, string oldText, string newText, string reason)
    {
        var (refusal, line) = CatalogueFiles.Break(file, linePrefix, oldText, newText);
        Assert.Equal(file, refusal.File);
        Assert.StartsWith(reason, refusal.Reason, StringComparison.Ordinal);
        Assert.InRange(refusal.Line, line - 5, line + 5); // the other row of the pair may be the one that is named
    }
}

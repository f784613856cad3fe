namespace PartitionService.Core.Tests.Catalogue;

/// <summary>Each rule about a single row, provoked by breaking a real row.</summary>
public sealed class RowRefusalTests
{
    [Theory]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "-10246", "ten",
        "column enthalpy_joule_per_mol holds 'ten', allowed is a number from -3000000 to 1000000")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "-10246", "NaN", "column enthalpy_joule_per_mol holds 'NaN'")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "-10246", "-1e9", "column enthalpy_joule_per_mol holds '-1e9'")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "6006", "0",
        "column sigma_joule_per_mol holds '0', allowed is a number above 0 and at most 100000")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "6006", "Infinity", "column sigma_joule_per_mol holds 'Infinity'")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "6006", "", "column sigma_joule_per_mol holds '', allowed is a text")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "1000,1700", "0,1700",
        "column temperature_min_kelvin holds '0', allowed is a number above 0 and at most 6000")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "1000,1700", "1701,1700",
        "column temperature_max_kelvin holds '1700', allowed is a number from 1701 to 6000")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "liquid,liquid", "molten,liquid",
        "column metal_state holds 'molten', allowed is one of: ")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "liquid,liquid", "liquid,gas", "column oxide_state holds 'gas'")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "yes", "true", "column preferred holds 'true'")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", ",yes,", ",no,", "column preferred_reason holds '', allowed is a text")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "memory", "hearsay", "column access holds 'hearsay'")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "estimate", "", "column source_ids holds '', allowed is at least one source id")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "estimate", "estimate;estimate", "column source_ids holds 'estimate;estimate'")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "hypothetical-state", "assumed",
        "column access holds 'memory', allowed is assumed, because the row is flagged assumed")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "AgO0.5", "Ag2O",
        "column oxide holds 'Ag2O', allowed is one metal atom followed by O")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "AgO0.5", "AgO0",
        "column oxide holds 'AgO0', allowed is a chemical formula (position 4: count 0")]
    [InlineData("oxidation.csv", "Ag,AgO0.5,liquid", "Ag,", "Au,", "column element holds 'Au', allowed is Ag, the element of AgO0.5")]
    [InlineData("chlorides.csv", "Mg,MgCl2", "Mg,", "Ca,", "column element holds 'Ca', allowed is Mg, the element of MgCl2")]
    [InlineData("gas_species.csv", "As4O6", "As:4;O:6", "As:4;O:5", "column atoms holds 'As:4;O:5', allowed is the atoms of As4O6")]
    [InlineData("gas_species.csv", "As4O6", "As:4;O:6", "As:4;O", "column atoms holds 'O', allowed is a symbol, a colon and a count")]
    [InlineData("gas_species.csv", "As4O6", "As4O6", "As4Oo6",
        "column species holds 'As4Oo6', allowed is a chemical formula (position 4: 'Oo' is not an element symbol)")]
    [InlineData("infinite_dilution.csv", "Cu,Ag", "Cu,Ag", "Ag,Ag",
        "column solute holds 'Ag', allowed is an element other than the solvent")]
    [InlineData("interactions.csv", "Cu,Ag,O", "Ag,O", "O,Ag",
        "column second holds 'Ag', allowed is a symbol not before 'O' in ordinal order")]
    [InlineData("slag_activities.csv", "iron-silicate,PbO", ",,0,0,", ",,1,0,",
        "column slope_per_unit holds '1', allowed is a slope other than 0 exactly where a variable is named")]
    [InlineData("slag_activities.csv", "iron-silicate,FeO,", "1.5,0.25,0.25,literature", "1.5,0.25,0.25,assumed",
        "column access holds 'memory', allowed is assumed, because the kind is assumed")]
    [InlineData("slag_activities.csv", "iron-silicate,FeO,", "iron-to-sio2-mass-ratio", "basicity", "column variable holds 'basicity'")]
    [InlineData("solubility_limits.csv", "Pb,Ag:2", "Ag:2;Zn:3", "Ag:2",
        "column exponents holds 'Ag:2', allowed is one element with exponent 1 or a pair")]
    [InlineData("solubility_limits.csv", "Pb,Ag:2", "Ag:2;Zn:3", "", "column exponents holds '', allowed is at least one entry")]
    [InlineData("entrainment.csv", "steel EAF", "0.5,2,6", "3,2,6",
        "column mass_percent_typical holds '2', allowed is a number from 3 to 100")]
    [InlineData("entrainment.csv", "steel EAF", "0.5,2,6", "0.5,2,1",
        "column mass_percent_high holds '1', allowed is a number from 2 to 100")]
    [InlineData("elements.csv", "Cu,", "Cu,", "Zn,", "column symbol holds 'Zn', allowed is an element symbol that no other row has", 1)]
    [InlineData("elements.csv", "Cu,", "Cu,", "Cx,", "column symbol holds 'Cx'")]
    [InlineData("elements.csv", "Cu,", "63.546", "-63.546", "column atomic_mass_gram_per_mol holds '-63.546'")]
    [InlineData("sources.csv", "definition", "definition", "estimate",
        "column id holds 'estimate', allowed is an id that no other row has", -1)]
    [InlineData("slag_components.csv", "soda-alkali,SiO2", "SiO2", "Na2O",
        "column component holds 'Na2O', allowed is a component that stands once in family 'soda-alkali'")]
    [InlineData("slag_families.csv", "soda-alkali", "soda-alkali", "lead-oxide",
        "column family holds 'lead-oxide', allowed is a name in lower case with hyphens that no other row has", -1)]
    [InlineData("slag_families.csv", "soda-alkali", "soda-alkali", "soda",
        "column family holds 'soda', allowed is a family with at least one row in slag_components.csv")]
    [InlineData("slag_families.csv", "iron-silicate", "entrainment/secondary", "entrainment/tertiary",
        "column entrainment_slot holds 'entrainment/tertiary-copper-black-copper'")]
    public void Row_is_refused_with_file_line_column_value_and_allowed_range(
        string file, string linePrefix, string oldText, string newText, string reason, int reportedOnOtherLine = 0)
    {
        var (refusal, line) = CatalogueFiles.Break(file, linePrefix, oldText, newText);
        Assert.Equal(file, refusal.File);
        Assert.StartsWith(reason, refusal.Reason, StringComparison.Ordinal);
        if (reportedOnOtherLine == 0)
            Assert.Equal(line, refusal.Line);
        else
            Assert.NotEqual(0, refusal.Line);
        Assert.Equal($"{file} line {refusal.Line}: {refusal.Reason}", refusal.Message);
    }
}

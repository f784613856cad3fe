using System.Text;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.CaseFiles;

/// <summary>Reads a case from YAML, strictly: a key that is not understood is an error, never ignored.</summary>
/// <remarks>
/// Only the shape is checked here. Ranges belong to the service, whose refusals <see cref="FieldPlaces"/> puts back to lines.
/// </remarks>
internal static class CaseFileReader
{
    /// <summary>Largest file, bytes.</summary>
    internal const int LargestFileBytes = 1024 * 1024;

    /// <summary>Most errors that are listed; more would only push the first ones off the screen.</summary>
    internal const int MostErrors = 100;

    /// <summary>Absolute zero on the other scale: 0 degC in kelvin.</summary>
    internal const double KelvinAtZeroCelsius = 273.15;

    private static readonly string[] RootKeys =
    [
        "name", "temperature_kelvin", "temperature_celsius", "pressure_atm", "charge", "metal", "slag", "gas", "oxygen", "allowances",
        "overrides",
    ];

    private static readonly string[] AllowanceKeys =
        ["metal_in_slag", "slag_in_metal_mass_percent", "mechanical_dust_mass_fraction", "stage_efficiencies"];

    private static readonly string[] OxygenKeys =
    [
        "log10_po2_atm", "co2_to_co_ratio", "h2o_to_h2_ratio", "metal_oxide_pair", "dissolved_oxygen_mass_ppm", "closed_balance",
    ];

    /// <summary>Reads a file.</summary>
    /// <param name="file">Path of the file.</param>
    /// <param name="cancellation">Stops reading.</param>
    /// <returns>The case with the places of its fields.</returns>
    /// <exception cref="CaseFileException">The file cannot be used; every error is listed.</exception>
    public static async Task<CaseFile> ReadFileAsync(string file, CancellationToken cancellation)
    {
        try
        {
            await using var stream = File.OpenRead(file);
            var bytes = new byte[LargestFileBytes + 1];
            var length = await stream.ReadAtLeastAsync(bytes, bytes.Length, throwOnEndOfStream: false, cancellation).ConfigureAwait(false);
            if (length > LargestFileBytes)
                throw Refuse(file, "The file is larger than 1 MiB, the most that a case file may be.");
            var text = new UTF8Encoding(false, throwOnInvalidBytes: true).GetString(bytes, 0, length);
            return Read(file, text.TrimStart('\uFEFF'));
        }
        catch (DecoderFallbackException)
        {
            throw Refuse(file, "The file is not UTF-8 text.");
        }
        catch (Exception fault) when (fault is FileNotFoundException or DirectoryNotFoundException)
        {
            throw Refuse(file, "There is no such file.");
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw Refuse(file, "The file cannot be read: " + fault.Message);
        }
    }

    /// <summary>Reads the text of a file.</summary>
    /// <param name="file">Name for error texts.</param>
    /// <param name="text">Contents.</param>
    /// <returns>The case with the places of its fields.</returns>
    /// <exception cref="CaseFileException">The text cannot be used; every error is listed.</exception>
    public static CaseFile Read(string file, string text)
    {
        var errors = new List<CaseFileError>();
        var places = new FieldPlaces();
        var vesselCase = new VesselCase();
        try
        {
            var root = Section.Open(CaseTreeReader.Read(text), "", FieldPlaces.Root, errors, places, RootKeys);
            if (root is not null)
                Fill(vesselCase, root);
        }
        catch (CaseTreeException fault)
        {
            errors.Add(fault.Error);
        }

        if (errors.Count > 0)
            throw new CaseFileException(file, InOrder(errors));
        return new CaseFile(file, vesselCase, places);
    }

    private static List<CaseFileError> InOrder(List<CaseFileError> errors)
    {
        List<CaseFileError> shown = [.. errors.OrderBy(error => error.Line).ThenBy(error => error.Column).Take(MostErrors)];
        if (errors.Count > MostErrors)
            shown.Add(new CaseFileError(0, 0, "", FormattableString.Invariant($"{errors.Count - MostErrors} further errors are not listed; mend these first.")));
        return shown;
    }

    private static CaseFileException Refuse(string file, string message) => new(file, [new CaseFileError(0, 0, "", message)]);

    private static void Fill(VesselCase vesselCase, Section root)
    {
        vesselCase.Name = root.Text("name") ?? "";
        switch (root.ExactlyOne("temperature_kelvin", "temperature_celsius"))
        {
            case "temperature_kelvin":
                vesselCase.TemperatureKelvin = root.Number("temperature_kelvin") ?? 0;
                break;
            case "temperature_celsius":
                vesselCase.TemperatureKelvin = (root.Number("temperature_celsius", "temperature_kelvin") ?? 0) + KelvinAtZeroCelsius;
                break;
        }

        if (root.Number("pressure_atm") is { } pressure)
            vesselCase.PressureAtm = pressure;
        root.Require("charge");
        foreach (var item in root.Items("charge", "formula", "mass_kg", "volume_normal_cubic_metre"))
            vesselCase.Charge.Add(ReadChargeItem(item));
        if (root.Inner("metal", "solvent") is { } metal)
            vesselCase.Metal = new MetalBath { Solvent = metal.Text("solvent") ?? "" };
        if (root.Inner("slag", "family") is { } slag)
        {
            slag.Require("family");
            vesselCase.Slag = new SlagBath { Family = slag.Text("family") ?? "" };
        }

        if (root.Has("gas") && !root.IsWord("gas", "none") && (root.IsWord("gas", "allowed") || root.Inner("gas") is not null))
            vesselCase.Gas = new GasAtmosphere();
        root.Require("oxygen");
        vesselCase.Oxygen = ReadOxygen(root);
        if (root.Inner("allowances", AllowanceKeys) is { } allowances)
            vesselCase.Allowances = ReadAllowances(allowances);
        foreach (var item in root.Items("overrides", "slot", "ln_gamma", "gibbs_energy_joule_per_mol", "epsilon", "source"))
            vesselCase.Overrides.Add(ReadOverride(item));
    }

    private static ChargeItem ReadChargeItem(Section item)
    {
        item.Require("formula");
        var charge = new ChargeItem { Formula = item.Text("formula") ?? "" };
        switch (item.ExactlyOne("mass_kg", "volume_normal_cubic_metre"))
        {
            case "mass_kg":
                charge.MassKg = item.Number("mass_kg") ?? 0;
                break;
            case "volume_normal_cubic_metre":
                charge.VolumeNormalCubicMetre = item.Number("volume_normal_cubic_metre") ?? 0;
                break;
        }

        return charge;
    }

    private static OxygenStatement? ReadOxygen(Section root)
    {
        if (root.IsWord("oxygen", "closed_balance"))
            return new OxygenStatement { ClosedBalance = new ClosedOxygenBalance() };
        if (root.Inner("oxygen", OxygenKeys) is not { } oxygen)
            return null;
        return oxygen.ExactlyOne(OxygenKeys) switch
        {
            "log10_po2_atm" => new OxygenStatement { Log10Po2Atm = oxygen.Number("log10_po2_atm") ?? 0 },
            "co2_to_co_ratio" => new OxygenStatement { Co2ToCoRatio = oxygen.Number("co2_to_co_ratio") ?? 0 },
            "h2o_to_h2_ratio" => new OxygenStatement { H2OToH2Ratio = oxygen.Number("h2o_to_h2_ratio") ?? 0 },
            "metal_oxide_pair" => ReadPair(oxygen),
            "dissolved_oxygen_mass_ppm" =>
                new OxygenStatement { DissolvedOxygenMassPpm = oxygen.Number("dissolved_oxygen_mass_ppm") ?? 0 },
            "closed_balance" when oxygen.Inner("closed_balance") is not null =>
                new OxygenStatement { ClosedBalance = new ClosedOxygenBalance() },
            _ => null,
        };
    }

    private static OxygenStatement? ReadPair(Section oxygen)
    {
        if (oxygen.Inner("metal_oxide_pair", "oxide", "oxide_activity", "metal_activity") is not { } section)
            return null;
        section.Require("oxide");
        var pair = new MetalOxidePair { Oxide = section.Text("oxide") ?? "" };
        if (section.Number("oxide_activity") is { } oxideActivity)
            pair.OxideActivity = oxideActivity;
        if (section.Number("metal_activity") is { } metalActivity)
            pair.MetalActivity = metalActivity;
        return new OxygenStatement { MetalOxidePair = pair };
    }

    private static PracticeAllowances ReadAllowances(Section section)
    {
        var allowances = new PracticeAllowances();
        if (section.IsWord("metal_in_slag", "typical"))
            allowances.MetalInSlag = new EntrainedMetal { FamilyTypical = true };
        else if (section.Inner("metal_in_slag", "mass_percent", "family_typical") is { } droplets)
            allowances.MetalInSlag = ReadDroplets(droplets);
        if (section.Number("slag_in_metal_mass_percent") is { } slag)
            allowances.SlagInMetalMassPercent = slag;
        if (section.Number("mechanical_dust_mass_fraction") is { } dust)
            allowances.MechanicalDustMassFraction = dust;
        foreach (var item in section.Items("stage_efficiencies", "element", "efficiency"))
        {
            item.Require("element");
            item.Require("efficiency");
            allowances.StageEfficiencies.Add(
                new StageEfficiency { Element = item.Text("element") ?? "", Efficiency = item.Number("efficiency") ?? 0 });
        }

        return allowances;
    }

    private static EntrainedMetal ReadDroplets(Section droplets) =>
        droplets.ExactlyOne("mass_percent", "family_typical") switch
        {
            "mass_percent" => new EntrainedMetal { MassPercent = droplets.Number("mass_percent") ?? 0 },
            "family_typical" => new EntrainedMetal { FamilyTypical = droplets.YesOrNo("family_typical") ?? false },
            _ => new EntrainedMetal(),
        };

    private static DatumOverride ReadOverride(Section item)
    {
        item.Require("slot");
        var replacement = new DatumOverride { Slot = item.Text("slot") ?? "", Source = item.Text("source") ?? "" };
        switch (item.ExactlyOne("ln_gamma", "gibbs_energy_joule_per_mol", "epsilon"))
        {
            case "ln_gamma":
                replacement.LnGamma = item.Number("ln_gamma") ?? 0;
                break;
            case "gibbs_energy_joule_per_mol":
                replacement.GibbsEnergyJoulePerMol = item.Number("gibbs_energy_joule_per_mol") ?? 0;
                break;
            case "epsilon":
                replacement.Epsilon = item.Number("epsilon") ?? 0;
                break;
        }

        return replacement;
    }
}

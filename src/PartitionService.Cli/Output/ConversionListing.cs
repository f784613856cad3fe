using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>Lays out the conversion of an activity.</summary>
internal static class ConversionListing
{
    /// <summary>Lays out one conversion, a quantity per row.</summary>
    /// <param name="request">What was asked.</param>
    /// <param name="response">What was answered.</param>
    /// <returns>The listing.</returns>
    public static Listing Of(ConvertActivityCoefficientRequest request, ConvertActivityCoefficientResponse response)
    {
        (string Quantity, double Value, string Unit)[] rows =
        [
            ($"activity, {Words.Hyphenated(request.From)} (given)", request.Activity, "1"),
            ($"activity, {Words.Hyphenated(request.To)}", response.Activity, "1"),
            ($"ln gamma0 of {request.Solute} in {request.Solvent}, {response.StandardState}", response.LnGamma0, "1"),
            ("mole fraction in the dilute limit", response.MoleFraction, "1"),
            ("mass % in the dilute limit", response.MassPercent, "mass %"),
            ("Gibbs energy from the pure substance to 1 mass %", response.GibbsEnergyToOneMassPercentJoulePerMol, "J/mol"),
        ];
        var origin = response.DatumKey.Length > 0 ? $"{response.DatumKey}, {Words.Of(response.Access)}" : "given on the command line";
        return new Listing(
            [new("", Alignment.Left), new("value", Alignment.Decimal), new("unit", Alignment.Left)],
            [.. rows.Select(row => ForReading(row.Quantity, row.Value, row.Unit)), ["source of ln gamma0", "", origin]],
            ["quantity", "value", "unit", "text"],
            [.. rows.Select(row => new[] { row.Quantity, Csv.Number(row.Value), row.Unit, "" }), ["source of ln gamma0", "", "", origin]],
            response);
    }

    private static string[] ForReading(string quantity, double value, string unit) =>
        [quantity, NumberText.Significant(value, 5, 1e7), unit == "1" ? "" : unit];
}

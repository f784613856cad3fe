using Google.Protobuf.Reflection;

namespace PartitionService.Contracts.Tests;

public sealed class UnitTests
{
    private static readonly string[] UnitSuffixes =
    [
        "_kelvin", "_atm", "_kg", "_mol", "_normal_cubic_metre", "_joule_per_mol", "_kilojoule_per_mol", "mass_percent",
        "mass_ppm", "_fraction", "_ratio",
    ];

    /// <summary>Numbers without a unit, or (value, sigma) with the unit in a field of its own.</summary>
    private static readonly string[] Dimensionless =
    [
        "activity", "activity_coefficient", "derivatives", "efficiency", "epsilon", "largest_balance_error", "ln_gamma", "ln_gamma0", "metal_activity",
        "oxide_activity", "partition_ratio_slag_to_metal", "sigma", "sigma_ln_gamma", "value",
    ];

    private static IEnumerable<FieldDescriptor> Numbers =>
        ProtoFiles.Messages.SelectMany(m => m.Fields.InDeclarationOrder()).Where(f => f.FieldType == FieldType.Double);

    [Fact]
    public void Every_number_names_its_unit() =>
        Assert.Empty(Numbers
            .Where(f => !Dimensionless.Contains(f.Name) && !UnitSuffixes.Any(s => f.Name.EndsWith(s, StringComparison.Ordinal)))
            .Select(f => f.FullName));

    [Fact]
    public void List_of_dimensionless_numbers_holds_nothing_that_is_gone() =>
        Assert.Empty(Dimensionless.Except(Numbers.Select(f => f.Name)));

    [Fact]
    public void List_of_units_holds_nothing_that_is_gone() =>
        Assert.DoesNotContain(UnitSuffixes, s => !Numbers.Any(f => f.Name.EndsWith(s, StringComparison.Ordinal)));

    [Fact]
    public void Value_and_sigma_stand_beside_their_unit() =>
        Assert.All(
            Numbers.Where(f => f.Name is "value" or "sigma"),
            f => Assert.NotNull(f.ContainingType.FindFieldByName("unit")));

    [Fact]
    public void No_number_is_single_precision() =>
        Assert.DoesNotContain(ProtoFiles.Messages.SelectMany(m => m.Fields.InDeclarationOrder()), f => f.FieldType == FieldType.Float);
}

using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Errors;
using PartitionService.Server.Mapping;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Tests.Mapping;

/// <summary>Both sides of every enumeration have the same names, and the mapping joins equal names.</summary>
public sealed class EnumMappingTests
{
    [Fact]
    public void Remark_codes_map_by_name() => Pairs<RemarkCode, Wire.RemarkCode>(EnumMapping.ToWire);

    [Fact]
    public void Severities_map_by_name() => Pairs<Severity, Wire.Severity>(EnumMapping.ToWire);

    [Fact]
    public void Derivative_outputs_map_by_name() => Pairs<DerivativeOutputKind, Wire.DerivativeOutputKind>(EnumMapping.ToWire);

    [Fact]
    public void Derivative_parameters_map_by_name() =>
        Pairs<DerivativeParameterKind, Wire.DerivativeParameterKind>(EnumMapping.ToWire);

    [Fact]
    public void Accesses_map_by_name() => Pairs<Access, Wire.Access>(access => EnumMapping.ToWire(access));

    [Fact]
    public void Coverage_trusts_map_by_name() => Pairs<CoverageTrust, Wire.CoverageTrust>(CoverageMapping.ToWire);

    [Fact]
    public void No_access_is_unspecified() => Assert.Equal(Wire.Access.Unspecified, EnumMapping.ToWire((Access?)null));

    [Fact]
    public void Every_failure_has_the_reason_of_its_name()
    {
        foreach (var failure in Enum.GetValues<SolveFailure>())
            Assert.Equal(failure.ToString(), FailureMapping.ToReason(failure).ToString());
    }

    /// <summary>Reasons beside the failures are those that the server itself gives; a new one must find its place.</summary>
    [Fact]
    public void Every_reason_is_either_a_failure_or_one_of_the_servers()
    {
        Wire.ErrorReason[] servers =
        [
            Wire.ErrorReason.InvalidCase,
            Wire.ErrorReason.UnknownDatum,
            Wire.ErrorReason.InvalidPageToken,
            Wire.ErrorReason.DeadlineExceeded,
            Wire.ErrorReason.Cancelled,
            Wire.ErrorReason.Internal,
            Wire.ErrorReason.MessageTooLarge,
            Wire.ErrorReason.UnreadableMessage,
        ];
        var failures = Enum.GetValues<SolveFailure>().Select(FailureMapping.ToReason);
        Assert.Equal(
            Enum.GetValues<Wire.ErrorReason>().Except([Wire.ErrorReason.Unspecified]).Order(), servers.Concat(failures).Order());
    }

    [Fact]
    public void Reasons_are_sent_in_upper_case_without_prefix()
    {
        Assert.Equal("OXYGEN_HAS_NO_HOME", ServiceErrors.ReasonName(Wire.ErrorReason.OxygenHasNoHome));
        Assert.All(Enum.GetValues<Wire.ErrorReason>(), r => Assert.Matches("^[A-Z]+(_[A-Z]+)*$", ServiceErrors.ReasonName(r)));
    }

    [Fact]
    public void Unknown_members_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => EnumMapping.ToWire((Access)99));
        Assert.Throws<ArgumentOutOfRangeException>(() => CoverageMapping.ToWire((CoverageTrust)99));
        Assert.Throws<ArgumentOutOfRangeException>(() => FailureMapping.ToReason((SolveFailure)99));
    }

    [Fact]
    public void Every_standard_state_has_its_own_words()
    {
        var words = Enum.GetValues<StandardState>().Select(StandardStateWords.Of).ToList();
        Assert.Equal(words.Count, words.Distinct().Count());
        Assert.Throws<ArgumentOutOfRangeException>(() => StandardStateWords.Of((StandardState)99));
    }

    private static void Pairs<TCore, TWire>(Func<TCore, TWire> map)
        where TCore : struct, Enum
        where TWire : struct, Enum
    {
        foreach (var member in Enum.GetValues<TCore>())
            Assert.Equal(member.ToString(), map(member).ToString());
        Assert.Equal(
            Enum.GetNames<TWire>().Where(n => n != "Unspecified").Order(StringComparer.Ordinal),
            Enum.GetNames<TCore>().Order(StringComparer.Ordinal));
    }
}

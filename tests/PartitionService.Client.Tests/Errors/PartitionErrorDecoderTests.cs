using Google.Protobuf;
using Google.Protobuf.WellKnownTypes;
using Google.Rpc;
using Grpc.Core;
using PartitionService.Client.Errors;
using PartitionService.Contracts.V1;

namespace PartitionService.Client.Tests.Errors;

public sealed class PartitionErrorDecoderTests
{
    [Fact]
    public void Lists_every_violation_of_an_invalid_case()
    {
        var bad = new BadRequest
        {
            FieldViolations =
            {
                new BadRequest.Types.FieldViolation { Field = "vessel_case.temperature_kelvin", Description = "is 20, must be in [500, 2500]" },
                new BadRequest.Types.FieldViolation { Field = "vessel_case.charge[3].mass_kg", Description = "is -1, must be in [0, 1e9]" },
            },
        };

        var fault = Assert.IsType<InvalidCaseException>(Decode(StatusCode.InvalidArgument, "INVALID_CASE", bad));

        Assert.Equal(
            [new FieldViolation("vessel_case.temperature_kelvin", "is 20, must be in [500, 2500]"), new FieldViolation("vessel_case.charge[3].mass_kg", "is -1, must be in [0, 1e9]")],
            fault.Violations);
        Assert.Equal(ErrorReason.InvalidCase, fault.Reason);
        Assert.Equal(StatusCode.InvalidArgument, fault.StatusCode);
        Assert.Equal("in words", fault.Message);
        Assert.Equal("r-1", fault.RequestId);
    }

    [Theory]
    [InlineData("OXYGEN_HAS_NO_HOME", ErrorReason.OxygenHasNoHome)]
    [InlineData("ELEMENT_HAS_NO_HOME", ErrorReason.ElementHasNoHome)]
    [InlineData("PRESSURE_EXCEEDED", ErrorReason.PressureExceeded)]
    [InlineData("NO_SOLVENT", ErrorReason.NoSolvent)]
    [InlineData("DISSOLVED_OXYGEN_NOT_REACHABLE", ErrorReason.DissolvedOxygenNotReachable)]
    public void Tells_which_condition_cannot_hold_and_for_which_elements(string sent, ErrorReason expected)
    {
        var fault = Assert.IsType<UnsolvableCaseException>(Decode(StatusCode.FailedPrecondition, sent));

        Assert.Equal(expected, fault.Reason);
        Assert.Equal(["Zn", "Cd"], fault.Elements);
    }

    [Theory]
    [InlineData(StatusCode.NotFound, "UNKNOWN_DATUM", typeof(UnknownDatumException))]
    [InlineData(StatusCode.Unavailable, "", typeof(PartitionUnavailableException))]
    [InlineData(StatusCode.DeadlineExceeded, "DEADLINE_EXCEEDED", typeof(PartitionTimeoutException))]
    [InlineData(StatusCode.Cancelled, "CANCELLED", typeof(PartitionTimeoutException))]
    [InlineData(StatusCode.InvalidArgument, "", typeof(InvalidCaseException))]
    [InlineData(StatusCode.InvalidArgument, "INVALID_PAGE_TOKEN", typeof(PartitionException))]
    [InlineData(StatusCode.Internal, "NOT_CONVERGED", typeof(PartitionException))]
    [InlineData(StatusCode.ResourceExhausted, "MESSAGE_TOO_LARGE", typeof(PartitionException))]
    [InlineData(StatusCode.Internal, "A_REASON_OF_TOMORROW", typeof(PartitionException))]
    public void Chooses_the_type_by_what_the_caller_can_do(StatusCode status, string reason, System.Type expected) =>
        Assert.IsType(expected, Decode(status, reason));

    [Fact]
    public void Every_reason_of_the_contract_is_understood()
    {
        foreach (var value in ErrorReasonNames())
            Assert.NotEqual(ErrorReason.Unspecified, Decode(StatusCode.Internal, value).Reason);
    }

    [Fact]
    public void Takes_no_reason_from_another_domain()
    {
        var info = new ErrorInfo { Domain = "proxy.example", Reason = "INVALID_CASE" };

        Assert.Equal(ErrorReason.Unspecified, DecodeDetails(StatusCode.Internal, info).Reason);
    }

    [Fact]
    public void Takes_the_request_id_from_either_detail()
    {
        Assert.Equal("from-info", DecodeDetails(StatusCode.Internal, new RequestInfo { RequestId = "from-info" }).RequestId);
        Assert.Equal("r-1", Decode(StatusCode.Internal, "INTERNAL").RequestId);
    }

    [Fact]
    public void Survives_a_failure_without_details()
    {
        var fault = PartitionErrorDecoder.Decode(new RpcException(new Grpc.Core.Status(StatusCode.Internal, "plain words")));

        Assert.Equal(("plain words", "", ErrorReason.Unspecified), (fault.Message, fault.RequestId, fault.Reason));
    }

    [Fact]
    public void Survives_details_that_are_garbled()
    {
        var trailers = new Metadata { { "grpc-status-details-bin", new byte[] { 0xFF, 0xFF, 0x01 } } };

        var fault = PartitionErrorDecoder.Decode(new RpcException(new Grpc.Core.Status(StatusCode.Unavailable, "gone"), trailers));

        Assert.IsType<PartitionUnavailableException>(fault);
        Assert.Equal("gone", fault.Message);
    }

    private static IEnumerable<string> ErrorReasonNames() =>
        ErrorReflection.Descriptor.EnumTypes.Single().Values.Where(value => value.Number != 0).Select(value => value.Name["ERROR_REASON_".Length..]);

    private static PartitionException Decode(StatusCode status, string reason, params IMessage[] more)
    {
        var info = new ErrorInfo { Domain = "partition.v1", Reason = reason, Metadata = { ["elements"] = "Zn, Cd", ["request_id"] = "r-1" } };
        return DecodeDetails(status, [info, .. more]);
    }

    private static PartitionException DecodeDetails(StatusCode status, params IMessage[] details)
    {
        var rich = new Google.Rpc.Status { Code = (int)status, Message = "in words", Details = { details.Select(Any.Pack) } };
        return PartitionErrorDecoder.Decode(rich.ToRpcException());
    }
}

using Google.Rpc;
using Grpc.Core;

namespace PartitionService.Server.Tests.Support;

/// <summary>What a refused call told its caller.</summary>
public sealed record CallError(StatusCode Status, string Message, ErrorInfo Info, BadRequest? BadRequest, RpcException Exception)
{
    public string Reason => Info.Reason;

    public IEnumerable<string> Fields => BadRequest!.FieldViolations.Select(v => v.Field);

    public BadRequest.Types.FieldViolation Violation(string field) => Assert.Single(BadRequest!.FieldViolations, v => v.Field == field);

    /// <summary>Makes a call that must fail with full details.</summary>
    public static async Task<CallError> OfAsync<T>(AsyncUnaryCall<T> call)
    {
        using (call)
        {
            var exception = await Assert.ThrowsAsync<RpcException>(async () => await call);
            var status = exception.GetRpcStatus();
            Assert.NotNull(status);
            Assert.Equal((int)exception.StatusCode, status.Code);
            var info = status.GetDetail<ErrorInfo>();
            Assert.NotNull(info);
            Assert.Equal("partition.v1", info.Domain);
            Assert.NotEmpty(info.Metadata["request_id"]);
            return new CallError(exception.StatusCode, status.Message, info, status.GetDetail<BadRequest>(), exception);
        }
    }
}

using Google.Protobuf;
using Grpc.Core;

namespace PartitionService.HostileInput.Running;

/// <summary>What came back.</summary>
/// <param name="Code">Status code.</param>
/// <param name="Answer">The answer; null where the call was refused.</param>
/// <param name="Refusal">Details of a refusal; null with an answer or where the refusal had none.</param>
/// <param name="Unforeseen">An exception that no refusal was made for; null where there was none or it is hidden by the wire.</param>
public sealed record Reply(StatusCode Code, IMessage? Answer, Google.Rpc.Status? Refusal, Exception? Unforeseen)
{
    /// <summary>A reply with an answer.</summary>
    public static Reply Of(IMessage answer) => new(StatusCode.OK, answer, null, null);

    /// <summary>A reply without one.</summary>
    public static Reply Of(RpcException refusal, Exception? unforeseen = null) =>
        new(refusal.StatusCode, null, refusal.GetRpcStatus(), unforeseen);
}

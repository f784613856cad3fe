using Grpc.Core;
using Grpc.Core.Interceptors;
using PartitionService.Server.Calls;
using PartitionService.Server.Log;
using PartitionService.Server.Options;

namespace PartitionService.Server.Errors;

/// <summary>The one place where exceptions become statuses.</summary>
internal sealed class ErrorInterceptor(ServerOptions options, ILogger<ErrorInterceptor> logger) : Interceptor
{
    /// <inheritdoc/>
    public override async Task<TResponse> UnaryServerHandler<TRequest, TResponse>(
        TRequest request, ServerCallContext context, UnaryServerMethod<TRequest, TResponse> continuation)
    {
        // Health and reflection keep the errors of their own protocols.
        if (!context.Method.StartsWith(ServiceMethods.Prefix, StringComparison.Ordinal))
            return await continuation(request, context);

        var record = CallRecord.Of(context);
        using var deadline = new CallDeadline(context, options.DefaultDeadlineSeconds);
        record.Cancellation = deadline.Token;
        try
        {
            var response = await continuation(request, context);
            record.Status = StatusCode.OK;
            return response;
        }
        catch (Exception exception)
        {
            var error = Translate(exception, record, deadline);
            record.Status = error.Status;
            record.Reason = ServiceErrors.ReasonName(error.Reason);
            throw ServiceErrors.ToStatus(error, record.RequestId).ToRpcException();
        }
    }

    private ServiceException Translate(Exception exception, CallRecord record, CallDeadline deadline)
    {
        switch (exception)
        {
            case ServiceException known:
                return known;
            case OperationCanceledException when deadline.Token.IsCancellationRequested:
                return deadline.TimeRanOut ? ServiceErrors.DeadlineExceeded() : ServiceErrors.Cancelled();
            default:
                // The message of an unforeseen exception may quote the request: type and place are logged, the message is not.
                ServerLog.UnexpectedException(logger, record.RequestId, ExceptionText.WithoutMessages(exception));
                return ServiceErrors.Internal(record.RequestId);
        }
    }
}

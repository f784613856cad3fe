using System.Globalization;
using System.Net;
using System.Net.Http.Headers;
using Google.Protobuf;
using Grpc.Core;

namespace PartitionService.HostileInput.Running;

/// <summary>A call whose frame is written by hand, so that its flag, its length and its packing may lie.</summary>
public static class RawCall
{
    /// <summary>Sends a body to a method and reads status and details.</summary>
    /// <param name="server">The server.</param>
    /// <param name="body">Frames as they go over the wire: flag, length in four bytes, message.</param>
    /// <param name="encoding">Packing that the header names; null: none.</param>
    public static async Task<(StatusCode Code, Google.Rpc.Status? Details)> SolveChargeAsync(LoopbackServer server, byte[] body, string? encoding = null)
    {
        using var client = new HttpClient { Timeout = TimeSpan.FromSeconds(60) };
        using var request = new HttpRequestMessage(HttpMethod.Post, new Uri(server.Address, Methods.Path("SolveCharge")))
        {
            Version = HttpVersion.Version20,
            VersionPolicy = HttpVersionPolicy.RequestVersionExact,
            Content = new ByteArrayContent(body),
        };
        request.Content.Headers.ContentType = new MediaTypeHeaderValue("application/grpc");
        request.Headers.TE.ParseAdd("trailers");
        if (encoding is not null)
            request.Headers.Add("grpc-encoding", encoding);
        using var response = await client.SendAsync(request);
        await response.Content.ReadAsByteArrayAsync();
        var code = Find(response, "grpc-status");
        var details = Find(response, "grpc-status-details-bin");
        return (
            (StatusCode)int.Parse(code!, CultureInfo.InvariantCulture),
            details is null ? null : Google.Rpc.Status.Parser.ParseFrom(ByteString.FromBase64(Padded(details))));
    }

    /// <summary>A frame around a message.</summary>
    public static byte[] Frame(byte flag, uint length, byte[] message) =>
        [flag, (byte)(length >> 24), (byte)(length >> 16), (byte)(length >> 8), (byte)length, .. message];

    private static string? Find(HttpResponseMessage response, string name) =>
        response.Headers.TryGetValues(name, out var early) ? early.First()
        : response.TrailingHeaders.TryGetValues(name, out var late) ? late.First() : null;

    private static string Padded(string text) => text + new string('=', (4 - (text.Length % 4)) % 4);
}

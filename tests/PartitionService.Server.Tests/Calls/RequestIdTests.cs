using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Server.Calls;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Calls;

public sealed class RequestIdTests(SharedServer shared) : IClassFixture<SharedServer>
{
    [Theory]
    [InlineData("a")]
    [InlineData("Furnace_2.heat-17")]
    [InlineData("0123456789012345678901234567890123456789012345678901234567890123")]
    public void Accepted_id_is_kept(string sent) => Assert.Equal(sent, RequestId.Choose(sent));

    [Theory]
    [InlineData(null)]
    [InlineData("")]
    [InlineData("a b")]
    [InlineData("a\n")]
    [InlineData("{\"x\":1}")]
    [InlineData("01234567890123456789012345678901234567890123456789012345678901234")]
    public void Other_id_is_replaced(string? sent)
    {
        var chosen = RequestId.Choose(sent);
        Assert.NotEqual(sent, chosen);
        Assert.Matches("^[0-9a-f]{32}$", chosen);
    }

    [Fact]
    public async Task Id_comes_back_with_an_answer()
    {
        using var call = shared.Server.Catalogue.ListSolventsAsync(new ListSolventsRequest(), Headers("heat-17"));
        Assert.Equal("heat-17", (await call.ResponseHeadersAsync).GetValue(RequestId.Header));
        Assert.NotEmpty((await call).Solvents);
    }

    [Fact]
    public async Task Id_comes_back_with_an_error()
    {
        using var call = shared.Server.Catalogue.ExplainDatumAsync(new ExplainDatumRequest { Slot = "x" }, Headers("heat-18"));
        var exception = await Assert.ThrowsAsync<RpcException>(async () => await call);
        Assert.Equal("heat-18", exception.Trailers.GetValue(RequestId.Header));
        Assert.Equal("heat-18", exception.GetRpcStatus()!.GetDetail<Google.Rpc.ErrorInfo>()!.Metadata["request_id"]);
    }

    [Fact]
    public async Task Call_without_an_id_gets_one()
    {
        using var call = shared.Server.Catalogue.ListSolventsAsync(new ListSolventsRequest());
        Assert.Matches("^[0-9a-f]{32}$", (await call.ResponseHeadersAsync).GetValue(RequestId.Header));
        await call;
    }

    private static Metadata Headers(string id) => new() { { RequestId.Header, id } };
}

using Google.Protobuf;
using PartitionService.HostileInput.Running;

namespace PartitionService.HostileInput.Mutation;

/// <summary>One request of a run.</summary>
/// <param name="Method">Name of the method.</param>
/// <param name="Bytes">What is sent.</param>
public sealed record HostileRequest(string Method, byte[] Bytes)
{
    /// <summary>A method without a seed fails the first run after it was added to the contract.</summary>
    private static readonly string[] OtherMethods = [.. Methods.Names.Where(name => name != "SolveCharge").Order(StringComparer.Ordinal)];

    /// <summary>Makes the request of a number in a run.</summary>
    /// <param name="seed">Seed of the run.</param>
    /// <param name="number">Number of the message.</param>
    /// <param name="genuineTokens">Page tokens that the service issued.</param>
    public static HostileRequest Make(int seed, int number, IReadOnlyList<string> genuineTokens)
    {
        var dice = new Dice(seed, number);
        var method = dice.OnceIn(4) ? dice.Of(OtherMethods) : "SolveCharge";
        var message = SeedMessages.For(method, dice);
        if (method == "SolveCharge" && dice.OnceIn(5))
        {
            MessageMutator.ChangeWithinLimits(message, dice);
            return new HostileRequest(method, message.ToByteArray());
        }

        if (!dice.OnceIn(50))
            MessageMutator.Change(message, dice);
        if (message.Descriptor.FindFieldByName("page_token") is { } token && dice.OnceIn(2))
            token.Accessor.SetValue(message, PageTokens.Any(genuineTokens, dice));
        var bytes = message.ToByteArray();
        return new HostileRequest(method, dice.OnceIn(6) ? ByteMutator.Change(bytes, dice) : bytes);
    }

    /// <summary>What a reader of a failed run needs to see it again.</summary>
    public string Describe(int seed, int number, MessageParser parser)
    {
        var place = FormattableString.Invariant($"seed {seed}, message {number}, {Method}");
        var text = Convert.ToBase64String(Bytes);
        try
        {
            text = JsonFormatter.Default.Format(parser.ParseFrom(Bytes));
        }
        catch (Exception unprintable) when (unprintable is InvalidProtocolBufferException or ArgumentException)
        {
            // Bytes that are no message have no JSON.
        }

        return $"{place}: {(text.Length > 6000 ? text[..6000] + "..." : text)}";
    }
}

namespace PartitionService.HostileInput.Mutation;

/// <summary>Chance that repeats: the same seed and message number give the same throws on every machine.</summary>
public sealed class Dice(int seed, int message)
{
    private readonly Random random = new(Mix(seed, message));

    /// <summary>A number in [0, sides).</summary>
    public int Throw(int sides) => random.Next(sides);

    /// <summary>True once in so many throws.</summary>
    public bool OnceIn(int throws) => random.Next(throws) == 0;

    /// <summary>A number in [0, 1).</summary>
    public double Fraction() => random.NextDouble();

    /// <summary>A number between two ends.</summary>
    public double Between(double low, double high) => low + (random.NextDouble() * (high - low));

    /// <summary>A number between two positive ends, every decade as likely as the next.</summary>
    public double Decades(double low, double high) => Math.Pow(10, Between(Math.Log10(low), Math.Log10(high)));

    /// <summary>One of several.</summary>
    public T Of<T>(IReadOnlyList<T> choices) => choices[random.Next(choices.Count)];

    /// <summary>So many random bytes.</summary>
    public byte[] Bytes(int count)
    {
        var bytes = new byte[count];
        random.NextBytes(bytes);
        return bytes;
    }

    /// <summary>Neighbouring seeds of the generator start alike; this spreads them (Steele, Lea and Flood 2014, finalizer).</summary>
    private static int Mix(int seed, int message)
    {
        var bits = ((ulong)(uint)seed << 32) | (uint)message;
        bits = (bits ^ (bits >> 30)) * 0xBF58476D1CE4E5B9;
        bits = (bits ^ (bits >> 27)) * 0x94D049BB133111EB;
        return (int)(bits ^ (bits >> 31));
    }
}

namespace PartitionService.IndependentSolution.Physics;

/// <summary>Phases in a fixed order.</summary>
internal enum Phase
{
    Metal,
    Slag,
    Gas,
    Carbon,
}

/// <summary>One species with its standard Gibbs energy over RT from the reference states of the elements, activity coefficient included.</summary>
internal sealed class Species(string name, Phase phase, Dictionary<string, double> atoms, double energy)
{
    public const string Inert = "(inert slag)";

    public string Name { get; } = name;

    public Phase Phase { get; } = phase;

    public Dictionary<string, double> Atoms { get; } = atoms;

    /// <summary>mu0/RT + ln gamma at fixed composition terms; + ln P in the gas.</summary>
    public double Energy { get; set; } = energy;
}

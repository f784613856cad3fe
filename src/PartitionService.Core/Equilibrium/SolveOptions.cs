namespace PartitionService.Core.Equilibrium;

/// <summary>What to compute besides the answer itself.</summary>
public sealed record SolveOptions
{
    /// <summary>The answer alone.</summary>
    public static SolveOptions None { get; } = new();

    /// <summary>Derivatives to report with the answer; null: none are computed.</summary>
    public DerivativeSelection? Derivatives { get; init; }
}

/// <summary>Groups of parameters to differentiate with respect to.</summary>
public sealed record DerivativeSelection
{
    /// <summary>Every group.</summary>
    public static DerivativeSelection All { get; } =
        new() { Temperature = true, Pressure = true, Oxygen = true, Inputs = true, Data = true };

    /// <summary>Temperature.</summary>
    public bool Temperature { get; init; }

    /// <summary>Total pressure.</summary>
    public bool Pressure { get; init; }

    /// <summary>What the statement about oxygen sets: the potential, the dissolved oxygen, or the oxygen input of a closed balance.</summary>
    public bool Oxygen { get; init; }

    /// <summary>Quantity of every charge item.</summary>
    public bool Inputs { get; init; }

    /// <summary>Every datum that entered.</summary>
    public bool Data { get; init; }
}

namespace PartitionService.Core.Catalogue;

/// <summary>What every catalogue row carries besides its numbers: identity, range, trust and sources.</summary>
/// <remarks>
/// Rows about the same quantity share a <see cref="Slot"/> (for example <c>metal/Cu/Pb</c>); the rows of one slot compete
/// or cover different temperature ranges and standard states. <see cref="Key"/> is the slot, a <c>#</c> and the
/// one-based position of the row in the slot: <c>metal/Cu/Pb#2</c>.
/// </remarks>
public abstract record Datum
{
    /// <summary>The quantity that the row is about, for example <c>slag/iron-silicate/PbO</c>.</summary>
    public required string Slot { get; init; }

    /// <summary>The row's own key: slot, <c>#</c>, one-based position in the slot.</summary>
    public required string Key { get; init; }

    /// <summary>Lower end of the fitted temperature range in kelvin, inclusive.</summary>
    public required double MinimumTemperatureKelvin { get; init; }

    /// <summary>Upper end of the fitted temperature range in kelvin, inclusive.</summary>
    public required double MaximumTemperatureKelvin { get; init; }

    /// <summary>True where this row counts; the other rows of the slot are kept for listing.</summary>
    public required bool Preferred { get; init; }

    /// <summary>Why this row is preferred or not; empty where it is the only one.</summary>
    public required string PreferredReason { get; init; }

    /// <summary>How the number was obtained.</summary>
    public required Access Access { get; init; }

    /// <summary>Ids of the sources, at least one, each present in <see cref="ThermochemicalCatalogue.Sources"/>.</summary>
    public required IReadOnlyList<string> SourceIds { get; init; }

    /// <summary>Machine-readable cautions about the row, for example <c>transferred-from-other-slag</c>; often empty.</summary>
    public required IReadOnlyList<string> Flags { get; init; }

    /// <summary>Free text about conditions and derivation; may be empty.</summary>
    public required string Note { get; init; }

    /// <summary>True where <paramref name="temperatureKelvin"/> lies in the fitted range, ends included.</summary>
    public bool Covers(double temperatureKelvin) =>
        temperatureKelvin >= MinimumTemperatureKelvin && temperatureKelvin <= MaximumTemperatureKelvin;

    /// <summary>Distance in kelvin from the fitted range; zero inside it.</summary>
    public double DistanceKelvin(double temperatureKelvin) =>
        Math.Max(0, Math.Max(MinimumTemperatureKelvin - temperatureKelvin, temperatureKelvin - MaximumTemperatureKelvin));
}

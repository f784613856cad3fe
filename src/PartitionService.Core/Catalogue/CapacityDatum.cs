namespace PartitionService.Core.Catalogue;

/// <summary>A published capacity or partition formula; the formula itself is coded by its id in Thermodynamics.</summary>
/// <remarks>Slot: <c>capacity/{id}</c>.</remarks>
public sealed record CapacityDatum : Datum
{
    /// <summary>Id, for example <c>sosinsky-cs</c>.</summary>
    public required string Id { get; init; }

    /// <summary>Quantity, for example <c>sulphide capacity</c>.</summary>
    public required string Quantity { get; init; }

    /// <summary>Formula as text, for listing.</summary>
    public required string Formula { get; init; }

    /// <summary>Meaning and units of the symbols.</summary>
    public required string Symbols { get; init; }

    /// <summary>Range of validity in words.</summary>
    public required string Validity { get; init; }

    /// <summary>One standard deviation of the log10; null where the source gives none.</summary>
    public double? SigmaLog10 { get; init; }

    /// <summary>Inputs of the worked example, as text; may be empty.</summary>
    public required string WorkedInputs { get; init; }

    /// <summary>Log10 of the worked example's answer, as text; may be empty.</summary>
    public required string WorkedValue { get; init; }
}

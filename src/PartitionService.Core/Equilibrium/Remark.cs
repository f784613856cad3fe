namespace PartitionService.Core.Equilibrium;

/// <summary>One thing to know about an answer.</summary>
/// <param name="Code">What it is about.</param>
/// <param name="Severity">How much it matters.</param>
/// <param name="Element">Element symbol; empty where it is not about one element.</param>
/// <param name="Subject">Species, phase or datum slot; may be empty.</param>
/// <param name="Text">The remark in a sentence.</param>
/// <param name="Numbers">The numbers of the sentence.</param>
public sealed record Remark(
    RemarkCode Code, Severity Severity, string Element, string Subject, string Text, IReadOnlyList<RemarkNumber> Numbers);

/// <summary>A number of a remark.</summary>
/// <param name="Name">What it is, snake case.</param>
/// <param name="Value">The value.</param>
/// <param name="Unit">Its unit, "1" where it has none.</param>
public sealed record RemarkNumber(string Name, double Value, string Unit);

/// <summary>How much a remark matters.</summary>
public enum Severity
{
    /// <summary>Good to know.</summary>
    Note = 1,

    /// <summary>Weakens a figure.</summary>
    Warning = 2,

    /// <summary>Makes a figure unusable.</summary>
    Serious = 3,
}

/// <summary>What a remark is about; the numbers equal those of the service's RemarkCode.</summary>
public enum RemarkCode
{
    /// <summary>A solute is so concentrated that Henry's law is doubtful.</summary>
    BeyondHenrianRange = 1,

    /// <summary>A datum was used outside its temperature range.</summary>
    ExtrapolatedInTemperature = 2,

    /// <summary>A datum was used outside its composition range, or its composition term was left out.</summary>
    ExtrapolatedInComposition = 3,

    /// <summary>A number was assumed.</summary>
    DatumAssumed = 4,

    /// <summary>The catalogue lacks a datum.</summary>
    DatumMissing = 5,

    /// <summary>The answer rests on recalled numbers.</summary>
    FromMemory = 6,

    /// <summary>An activity is above 1.</summary>
    ActivityAboveOne = 7,

    /// <summary>A solubility limit is exceeded.</summary>
    SolubilityExceeded = 8,

    /// <summary>An element would boil off but there is no gas.</summary>
    NoGasToBoilInto = 9,

    /// <summary>A phase that was allowed did not form.</summary>
    PhaseAbsent = 10,

    /// <summary>The metal was consumed.</summary>
    MetalConsumed = 11,

    /// <summary>An interaction term was bounded.</summary>
    InteractionBounded = 12,

    /// <summary>The catalogue value was replaced by the caller's.</summary>
    DatumOverridden = 13,

    /// <summary>A catalogue row carries a caution of its own.</summary>
    DatumFlagged = 14,

    /// <summary>Carbon stays unburnt.</summary>
    UnburntCarbon = 15,

    /// <summary>A constituent was carried as an inert part of the slag.</summary>
    CarriedAsInert = 16,

    /// <summary>An allowance could not be met in full.</summary>
    AllowanceLimited = 17,

    /// <summary>The metal is a concentrated mixture.</summary>
    ConcentratedMetal = 18,

    /// <summary>The slag leaves the usual window of its family.</summary>
    SlagOutsideFamily = 19,

    /// <summary>Entrainment is off although it usually dominates the loss of a noble metal.</summary>
    EntrainmentIgnored = 20,
}

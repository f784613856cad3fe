namespace PartitionService.PublishedChecks.Judging;

/// <summary>Verdict on a row.</summary>
internal enum Verdict
{
    /// <summary>Scored, and the statement holds within its tolerance.</summary>
    Held,

    /// <summary>Scored, and the statement does not hold.</summary>
    Missed,

    /// <summary>Computed for information; not scored.</summary>
    Context,

    /// <summary>The product lacks the phase or the quantity; not scored.</summary>
    NotComputable,
}

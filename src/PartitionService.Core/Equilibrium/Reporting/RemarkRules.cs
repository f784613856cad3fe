using System.Globalization;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>All remarks of an answer, most severe first.</summary>
internal static class RemarkRules
{
    /// <summary>Collects the remarks of every rule.</summary>
    public static IReadOnlyList<Remark> All(ReportContext context)
    {
        var relevant = RelevantSlots.Find(context);
        return
        [
            .. PhaseRemarks.All(context)
                .Concat(CompositionRemarks.All(context))
                .Concat(SaturationRemarks.All(context))
                .Concat(DatumRemarks.All(context, relevant))
                .OrderByDescending(remark => remark.Severity)
                .ThenBy(remark => remark.Code)
                .ThenBy(remark => remark.Element, StringComparer.Ordinal)
                .ThenBy(remark => remark.Subject, StringComparer.Ordinal),
        ];
    }

    /// <summary>A number in at most three digits, invariant.</summary>
    public static string Short(double value) => value.ToString("G3", CultureInfo.InvariantCulture);
}

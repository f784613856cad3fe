using PartitionService.Core.Equilibrium;
using Xunit.Abstractions;

namespace PartitionService.Core.Tests.Equilibrium.Derivatives;

/// <summary>Compares columns of a report with central differences and counts what was compared.</summary>
internal sealed class DerivativeComparison
{
    /// <summary>A quotient counts where its own error is below this share of it.</summary>
    private const double QuotientQuality = 2e-6;

    /// <summary>Largest accepted relative disagreement.</summary>
    private const double Tolerance = 1e-5;

    /// <summary>Number of derivatives compared.</summary>
    public int Compared { get; private set; }

    /// <summary>Largest relative disagreement.</summary>
    public double Worst { get; private set; }

    /// <summary>Where it was.</summary>
    public string WorstAt { get; private set; } = "";

    /// <summary>Everything beyond tolerance.</summary>
    public List<string> Faults { get; } = [];

    /// <summary>Compares one column.</summary>
    public void Add(
        DerivativeReport report, DerivativeColumn column, IReadOnlyList<CentralDifference.Estimate> estimates)
    {
        Assert.True(column.IsDefined, $"{column.Kind} {column.Name} has no derivative");
        for (var o = 0; o < report.Outputs.Count; o++)
        {
            var estimate = estimates[o];
            if (double.IsNaN(estimate.Largest))
            {
                continue;
            }

            var exact = column.Values[o];
            var label = FormattableString.Invariant(
                $"d {report.Outputs[o].Kind} {report.Outputs[o].Element} / d {column.Kind} {column.Name}: {exact:G9}, quotient {estimate.Value:G9} +- {estimate.Error:G3}");
            if (!double.IsFinite(exact) || Math.Abs(exact - estimate.Value) > (100 * estimate.Error) + (Tolerance * Math.Abs(estimate.Value)))
            {
                Faults.Add(label);
            }

            if (estimate.Error > QuotientQuality * Math.Abs(estimate.Value) || estimate.Value == 0)
            {
                continue;
            }

            Compared++;
            var disagreement = Math.Abs(exact - estimate.Value) / Math.Abs(estimate.Value);
            if (disagreement > Worst)
            {
                (Worst, WorstAt) = (disagreement, label);
            }

            if (disagreement > Tolerance)
            {
                Faults.Add(label);
            }
        }
    }

    /// <summary>Fails where anything disagrees or too little was compared.</summary>
    public void Check(int least, ITestOutputHelper output)
    {
        output.WriteLine(FormattableString.Invariant($"{Compared} compared, worst {Worst:E1}: {WorstAt}"));
        Assert.True(Faults.Count == 0, $"{Faults.Count} disagree:{Environment.NewLine}{string.Join(Environment.NewLine, Faults.Take(25))}");
        Assert.True(Compared >= least, $"only {Compared} quotients were good enough to compare");
    }
}

using System.Globalization;

namespace PartitionService.Cli.Tests;

/// <summary>Runs code under a culture that writes 1.5 as 1,5, as de-DE does; made by hand because the tool runs without culture data.</summary>
internal static class CommaCulture
{
    public static T Run<T>(Func<T> action)
    {
        var before = CultureInfo.CurrentCulture;
        var culture = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        culture.NumberFormat.NumberDecimalSeparator = ",";
        culture.NumberFormat.NumberGroupSeparator = ".";
        culture.NumberFormat.NegativeSign = "\u2212";
        CultureInfo.CurrentCulture = culture;
        try
        {
            Assert.Equal("−1,5", (-1.5).ToString(CultureInfo.CurrentCulture));
            return action();
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}

using System.Globalization;

namespace PartitionService.PublishedChecks.Rows;

/// <summary>Settings of a case, written as <c>key=value;key=value</c>; alternatives of one value stand between bars.</summary>
internal sealed class Setup
{
    private readonly Dictionary<string, string> settings;

    /// <summary>Reads settings.</summary>
    public Setup(string text)
    {
        Text = text;
        settings = text.Contains('=', StringComparison.Ordinal)
            ? text.Split(';').Select(part => part.Split('=', 2))
                .ToDictionary(part => part[0], part => part[1], StringComparer.Ordinal)
            : [];
    }

    /// <summary>The settings as written.</summary>
    public string Text { get; }

    /// <summary>A setting; throws where it is missing.</summary>
    public string this[string key] => settings[key];

    /// <summary>True where the setting stands.</summary>
    public bool Has(string key) => settings.ContainsKey(key);

    /// <summary>Alternatives of a setting; one empty text where it is missing.</summary>
    public IReadOnlyList<string> Alternatives(string key) => settings.TryGetValue(key, out var value) ? value.Split('|') : [""];

    /// <summary>A number; throws where it is missing.</summary>
    public double Number(string key) => double.Parse(settings[key], NumberStyles.Float, CultureInfo.InvariantCulture);

    /// <summary>A number, or the usual one.</summary>
    public double Number(string key, double usual) => Has(key) ? Number(key) : usual;

    /// <summary>Formulas with amounts, written as <c>FeO:50,SiO2:30</c>; empty where the setting is missing.</summary>
    public IReadOnlyList<(string Formula, double Amount)> Amounts(string key) =>
        !Has(key) ? []
        : [.. settings[key].Split(',').Select(part => part.Split(':'))
            .Select(part => (part[0], double.Parse(part[1], NumberStyles.Float, CultureInfo.InvariantCulture)))];

    /// <summary>A copy with one setting replaced.</summary>
    public Setup With(string key, string value)
    {
        var others = settings.Where(pair => pair.Key != key).Select(pair => $"{pair.Key}={pair.Value}");
        return new Setup(string.Join(';', others.Append($"{key}={value}")));
    }

    /// <summary>The setup after a change: every setting with the suffix <c>_after</c> takes the place of the one without.</summary>
    public Setup After()
    {
        var changed = this;
        foreach (var (key, value) in settings.Where(pair => pair.Key.EndsWith("_after", StringComparison.Ordinal)))
        {
            changed = changed.With(key[..^"_after".Length], value);
        }

        return changed;
    }

    /// <summary>All combinations of the alternatives of family and oxygen.</summary>
    public IEnumerable<Setup> Combinations()
    {
        foreach (var family in Alternatives("family"))
        {
            foreach (var oxygen in Alternatives("oxygen"))
            {
                var one = family.Length > 0 ? With("family", family) : this;
                yield return oxygen.Length > 0 ? one.With("oxygen", oxygen) : one;
            }
        }
    }
}

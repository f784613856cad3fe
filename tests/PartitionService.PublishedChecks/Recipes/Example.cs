using System.Text.Json;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Inputs of a worked example by the symbols of its formula.</summary>
/// <param name="json">Object of numbers.</param>
internal sealed class Example(string json)
{
    private readonly Dictionary<string, double> inputs = JsonSerializer.Deserialize<Dictionary<string, double>>(json)!;

    /// <summary>An input.</summary>
    public double this[string symbol] => inputs[symbol];

    /// <summary>True where the example has this input.</summary>
    public bool Has(string symbol) => inputs.ContainsKey(symbol);
}

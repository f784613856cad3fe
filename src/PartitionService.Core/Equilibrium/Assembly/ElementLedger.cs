namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Amounts of the elements in mol by element symbol.</summary>
internal sealed class ElementLedger
{
    private readonly SortedDictionary<string, double> amounts = new(StringComparer.Ordinal);

    /// <summary>Elements with an entry, ordinal order, so that sums do not depend on the order of the charge.</summary>
    public IEnumerable<string> Elements => amounts.Keys;

    /// <summary>Amount of an element in mol; zero where absent.</summary>
    public double this[string element] => amounts.GetValueOrDefault(element);

    /// <summary>Adds an amount in mol, which may be negative.</summary>
    public void Add(string element, double mol)
    {
        if (mol != 0)
        {
            amounts[element] = amounts.GetValueOrDefault(element) + mol;
        }
    }

    /// <summary>Mass in kg.</summary>
    /// <param name="elements">Atomic masses.</param>
    public double MassKg(IReadOnlyDictionary<string, Catalogue.Element> elements) =>
        amounts.Sum(entry => entry.Value * elements[entry.Key].AtomicMassGramPerMol) / 1000;
}

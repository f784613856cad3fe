using System.Diagnostics.CodeAnalysis;
using System.Globalization;

namespace PartitionService.Core.Catalogue;

/// <summary>A chemical formula resolved into atoms, for example <c>AsO1.5</c>, <c>Al2(SO4)3</c> or <c>Ca5(PO4)3F</c>.</summary>
/// <remarks>
/// Grammar: element symbols and groups in round or square brackets, each followed by an optional count. Counts are decimal
/// numbers with a point, above 0 and at most <see cref="MaximumCount"/>. Charges and hydrate dots are not accepted.
/// </remarks>
public sealed record ChemicalFormula
{
    /// <summary>Longest text accepted, in characters.</summary>
    public const int MaximumLength = 100;

    /// <summary>Deepest nesting of brackets accepted.</summary>
    public const int MaximumNesting = 6;

    /// <summary>Largest count accepted, for one atom or group and for the sum of an element.</summary>
    public const double MaximumCount = 1000;

    private ChemicalFormula(string text, OrderedDictionary<string, double> atoms)
    {
        Text = text;
        Atoms = atoms;
    }

    /// <summary>The formula as it was written.</summary>
    public string Text { get; }

    /// <summary>Atoms per formula unit by element symbol, in the order of first appearance; every count is above 0.</summary>
    public IReadOnlyDictionary<string, double> Atoms { get; }

    /// <summary>Resolves a formula.</summary>
    /// <param name="text">Formula, at most <see cref="MaximumLength"/> characters.</param>
    /// <param name="formula">The resolved formula; null where the text is not acceptable.</param>
    /// <param name="error">Position (one-based) and reason; empty where the text is acceptable.</param>
    /// <returns>True where the text is a formula.</returns>
    public static bool TryParse(string? text, [NotNullWhen(true)] out ChemicalFormula? formula, out string error)
    {
        formula = null;
        if (string.IsNullOrEmpty(text))
        {
            error = "position 1: the formula is empty";
            return false;
        }

        if (text.Length > MaximumLength)
        {
            error = string.Create(
                CultureInfo.InvariantCulture,
                $"position {MaximumLength + 1}: the formula has {text.Length} characters, at most {MaximumLength} are accepted");
            return false;
        }

        var reader = new ChemicalFormulaReader(text);
        if (reader.Read() is not { } atoms)
        {
            error = reader.Error;
            return false;
        }

        formula = new ChemicalFormula(text, atoms);
        error = "";
        return true;
    }

    /// <summary>Resolves a formula.</summary>
    /// <exception cref="FormatException">The text is not a formula; the message gives position and reason.</exception>
    public static ChemicalFormula Parse(string text) =>
        TryParse(text, out var formula, out var error) ? formula : throw new FormatException($"'{text}': {error}");

    /// <summary>Molar mass in g/mol of formula units.</summary>
    /// <param name="elements">Elements by symbol, with their atomic masses.</param>
    /// <exception cref="KeyNotFoundException">An element of the formula is not among <paramref name="elements"/>.</exception>
    public double MolarMass(IReadOnlyDictionary<string, Element> elements)
    {
        var mass = 0.0;
        foreach (var (symbol, count) in Atoms)
        {
            if (!elements.TryGetValue(symbol, out var element))
                throw new KeyNotFoundException($"'{Text}': the catalogue has no atomic mass for {symbol}");
            mass += count * element.AtomicMassGramPerMol;
        }

        return mass;
    }

    /// <summary>Atoms of one element per formula unit; zero where the element does not occur.</summary>
    public double Count(string symbol) => Atoms.GetValueOrDefault(symbol);

    /// <summary>True where both formulas were written alike; <c>H2O</c> and <c>OH2</c> differ.</summary>
    public bool Equals(ChemicalFormula? other) => other is not null && string.Equals(Text, other.Text, StringComparison.Ordinal);

    /// <inheritdoc/>
    public override int GetHashCode() => StringComparer.Ordinal.GetHashCode(Text);

    /// <inheritdoc/>
    public override string ToString() => Text;
}

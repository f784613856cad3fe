using System.Globalization;
using System.Text;

namespace PartitionService.Core.Catalogue;

/// <summary>Recursive-descent reader of one formula; nesting is bounded, so recursion is too.</summary>
internal sealed class ChemicalFormulaReader(string text)
{
    private int position;

    /// <summary>Position and reason of the first fault; empty before one is met.</summary>
    public string Error { get; private set; } = "";

    /// <summary>Atoms of the whole text, or null where it is faulty.</summary>
    public OrderedDictionary<string, double>? Read() => ReadGroup(closing: '\0', nesting: 0, opened: 0);

    private OrderedDictionary<string, double>? ReadGroup(char closing, int nesting, int opened)
    {
        var atoms = new OrderedDictionary<string, double>(StringComparer.Ordinal);
        while (position < text.Length)
        {
            var start = position;
            var character = text[position];
            if (character is ')' or ']')
                return CloseGroup(atoms, character, closing);
            var inner = character is '(' or '['
                ? OpenGroup(character, nesting)
                : char.IsAsciiLetterUpper(character)
                    ? ReadSymbol()
                    : Fail(start, $"'{WholeCharacter(start)}' cannot start an element symbol or a group");
            if (inner is null || ReadCount() is not { } count || !Add(atoms, inner, count, start))
                return null;
        }

        return closing == '\0' ? atoms : Fail(opened, $"the bracket opened here is not closed by '{closing}'");
    }

    private OrderedDictionary<string, double>? OpenGroup(char opening, int nesting)
    {
        var opened = position;
        if (nesting == ChemicalFormula.MaximumNesting)
            return Fail(opened, $"more than {ChemicalFormula.MaximumNesting} nested brackets");
        position++;
        return ReadGroup(opening == '(' ? ')' : ']', nesting + 1, opened);
    }

    private OrderedDictionary<string, double>? CloseGroup(OrderedDictionary<string, double> atoms, char found, char expected)
    {
        if (found != expected)
            return Fail(position, expected == '\0' ? $"'{found}' closes no bracket" : $"'{found}' stands where '{expected}' is expected");
        if (atoms.Count == 0)
            return Fail(position, "the brackets hold nothing");
        position++;
        return atoms;
    }

    private OrderedDictionary<string, double>? ReadSymbol()
    {
        var start = position;
        var length = start + 1 < text.Length && char.IsAsciiLetterLower(text[start + 1]) ? 2 : 1;
        var symbol = text.Substring(start, length);
        if (!ElementSymbols.Contains(symbol))
            return Fail(start, $"'{symbol}' is not an element symbol");
        position += length;
        return new(StringComparer.Ordinal) { [symbol] = 1 };
    }

    private double? ReadCount()
    {
        var start = position;
        while (position < text.Length && (char.IsAsciiDigit(text[position]) || text[position] == '.'))
            position++;
        if (position == start)
            return 1;
        var digits = text.AsSpan(start, position - start);
        if (digits[0] == '.' || digits[^1] == '.'
            || !double.TryParse(digits, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var count))
        {
            Fail(start, $"'{digits}' is not a count");
            return null;
        }

        if (count > 0 && count <= ChemicalFormula.MaximumCount)
            return count;
        Fail(start, $"count {digits} is outside 0 (excluded) to {ChemicalFormula.MaximumCount:0}");
        return null;
    }

    private bool Add(OrderedDictionary<string, double> atoms, OrderedDictionary<string, double> inner, double count, int start)
    {
        foreach (var (symbol, innerCount) in inner)
        {
            var sum = atoms.GetValueOrDefault(symbol) + (innerCount * count);
            if (!(sum > 0 && sum <= ChemicalFormula.MaximumCount))
            {
                Fail(start, $"{symbol} adds up to more than {ChemicalFormula.MaximumCount:0} or to nothing");
                return false;
            }

            atoms[symbol] = sum;
        }

        return true;
    }

    /// <summary>The character at a position, both halves of a pair: half of one is no text.</summary>
    private string WholeCharacter(int at) => Rune.TryGetRuneAt(text, at, out var rune) ? rune.ToString() : "\uFFFD";

    private OrderedDictionary<string, double>? Fail(int at, string reason)
    {
        Error = string.Create(CultureInfo.InvariantCulture, $"position {at + 1}: {reason}");
        return null;
    }
}

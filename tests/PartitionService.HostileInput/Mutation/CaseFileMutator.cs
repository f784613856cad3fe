using System.Text;
using System.Text.RegularExpressions;

namespace PartitionService.HostileInput.Mutation;

/// <summary>Changes the text of a case file: a word, a line, the layout, or all of it.</summary>
public static partial class CaseFileMutator
{
    private const int Mebi = 1024 * 1024;

    private static readonly string[] Values =
    [
        ".nan", ".inf", "-.inf", "NaN", "1e999", "-1e999", "5e-324", "0x10", "0o7", "1_000", "1,5", "1.5.2", "-", "+", "\uFF11\uFF12", "true", "null", "~",
        "[]", "{}", "[1, 2]", "{a: 1}", "\"5\"", "'5'", "|", ">", "!!float 5", "!x 5", "&a 5", "*a", "0", "-1", "1e308", "2024-01-01", "@", "`", "%",
    ];

    private static readonly string[] Pieces =
    [
        "\t", "\t- ", "\0", "\u0007", "\u001b[2J", "\uFEFF", "\u2028", "\u0085", "\uD800", "\uDC00x", "\U0001F525", "&a ", "*a", "<<: *a", "!!python/object:x ",
        "!<tag:x> ", "{", "}", "[", "]", ": ", "- ", "? ", "# ", "|", ">", "\"", "'", "---\n", "...\n", "%YAML 9.9\n---\n", "%TAG ! x\n---\n", "\r", "\r\n",
        "\"\\uD800\"", "\"\\UFFFFFFFF\"", "\"\\x\"", ",", "  ", "\n\n", "name: twice\n", "oxygen: closed_balance\n", "unknown_key: 1\n", "tempertaure_kelvin: 5\n",
    ];

    /// <summary>Changes a text in one to four places.</summary>
    public static string Change(string text, Dice dice)
    {
        if (dice.OnceIn(15))
            return Whole(dice);
        for (var changes = 1 + dice.Throw(4); changes > 0; changes--)
            text = ChangeOnce(text, dice);
        return text;
    }

    private static string ChangeOnce(string text, Dice dice)
    {
        switch (dice.Throw(8))
        {
            case 0 or 1:
                var numbers = Number().Matches(text);
                return numbers.Count == 0 ? text : Replace(text, dice.Of(numbers), dice.Of(Values));
            case 2 or 3:
                return text.Insert(dice.Throw(text.Length + 1), dice.Of(Pieces));
            case 4:
                var words = Word().Matches(text);
                return words.Count == 0 ? text : Replace(text, dice.Of(words), dice.OnceIn(2) ? HostileTexts.Letters(dice) : dice.Of(words).Value);
            case 5 when text.Length > 0:
                var at = dice.Throw(text.Length);
                return text.Remove(at, Math.Min(text.Length - at, 1 + dice.Throw(30)));
            default:
                return ChangeLines(text, dice);
        }
    }

    private static string ChangeLines(string text, Dice dice)
    {
        List<string> lines = [.. text.Split('\n')];
        var line = dice.Throw(lines.Count);
        switch (dice.Throw(4))
        {
            case 0:
                lines.Insert(dice.Throw(lines.Count), lines[line]);
                break;
            case 1:
                lines.RemoveAt(line);
                break;
            case 2:
                lines[line] = new string(' ', dice.Throw(12)) + lines[line];
                break;
            default:
                lines[line] = lines[line].Replace("  ", "\t", StringComparison.Ordinal);
                break;
        }

        return string.Join('\n', lines);
    }

    /// <summary>Files that are hostile as a whole; the huge ones seldom, they take their time to write.</summary>
    private static string Whole(Dice dice) => dice.Throw(dice.OnceIn(25) ? 14 : 6) switch
    {
        0 => Encoding.Latin1.GetString(dice.Bytes(dice.Throw(2000))),
        1 => HostileTexts.Letters(dice),
        2 => "a: &a [x, x]\nb: &b [*a, *a, *a]\nc: &c [*b, *b, *b]\ncharge: [*c, *c, *c]\n",
        3 => Repeat(dice.Of(["[", "{a: ", "- ", "? ", "{? [", "a:\n "]), 10 + dice.Throw(3000)),
        4 => "charge:\n" + Repeat(" ", dice.Throw(2000)) + "- x",
        5 => dice.Of(["", " ", "\n", "---", "--- \n---", "null", "5", "[]", "{}", "- a", "\uFEFF", "#"]),
        6 => $"name: {new string('a', Mebi - 10)}",
        7 => $"temperature_kelvin: {new string('9', Mebi - 30)}",
        8 => Repeat("charg: 1\n", Mebi / 10),
        9 => string.Concat(Enumerable.Range(0, 40_000).Select(key => FormattableString.Invariant($"temperature_kelvi{key}: 1\n"))),
        10 => "charge:\n" + Repeat("- {formula: Cu, mass_kg: x}\n", Mebi / 30),
        11 => new string('k', Mebi - 10) + ": 1",
        12 => Repeat("[", Mebi - 1),
        _ => "name: |\n" + Repeat(" a\n", Mebi / 4),
    };

    private static string Replace(string text, Match place, string by) => text.Remove(place.Index, place.Length).Insert(place.Index, by);

    private static string Repeat(string text, int times) => string.Concat(Enumerable.Repeat(text, times));

    [GeneratedRegex(@"(?<=[:\s])-?[0-9][0-9.e+-]*")]
    private static partial Regex Number();

    [GeneratedRegex(@"[A-Za-z][A-Za-z0-9_]+")]
    private static partial Regex Word();
}

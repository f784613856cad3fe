using System.Text;

namespace PartitionService.HostileInput.Mutation;

/// <summary>Texts that break careless handling of text.</summary>
public static class HostileTexts
{
    private const int Mebi = 1024 * 1024;

    private static readonly string[] Odd =
    [
        "", " ", "\0", "\r\n", "\t", "\u0007\u001b[31m", "\u202Eexcel\u202C", "\u200B", "\uFEFFCu", "\uFFFD", "\U0001F525", "Cu\U0001F525",
        "e\u0301", "\u0130", "%s%n{0}{{}}", "../../etc", "'; --", "<b>", "null", "NaN", "-0", "\\u0000", "metal/", "/", "//////",
        "metal/Cu/Pb#1", "metal/Cu/Pb#99999999999", "metal/Cu/Cu", "slag/iron-silicate/", "interaction/Cu/Z/A", "gas/", "oxidation/air",
    ];

    /// <summary>An odd text, seldom a long one, very seldom a huge one.</summary>
    public static string Any(Dice dice)
    {
        if (dice.OnceIn(2000))
            return new string((char)('A' + dice.Throw(26)), Mebi);
        if (dice.OnceIn(12))
            return Repeated(dice.Of(Odd), 95 + dice.Throw(200));
        if (dice.OnceIn(4))
            return Letters(dice);
        return dice.Of(Odd);
    }

    /// <summary>A text of any characters but lone halves of pairs, which no valid message can carry.</summary>
    public static string Letters(Dice dice)
    {
        var text = new StringBuilder();
        for (var left = dice.Throw(40); left > 0; left--)
        {
            var value = dice.OnceIn(3) ? dice.Throw(0x110000) : 0x20 + dice.Throw(0x5F);
            if (Rune.IsValid(value))
                text.Append(new Rune(value));
        }

        return text.ToString();
    }

    private static string Repeated(string text, int length)
    {
        var unit = text.Length == 0 ? "a" : text;
        return string.Concat(Enumerable.Repeat(unit, 1 + (length / unit.Length)));
    }
}

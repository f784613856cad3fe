using System.Text;

namespace PartitionService.Cli.Output;

/// <summary>Keeps text readable on any terminal.</summary>
internal static class PlainText
{
    /// <summary>Replaces control characters: names and remarks come from elsewhere and must not steer the terminal.</summary>
    /// <param name="text">Any text.</param>
    /// <returns>The text with a blank for each control character.</returns>
    public static string Clean(string text) =>
        text.Any(char.IsControl) ? string.Concat(text.Select(letter => char.IsControl(letter) ? ' ' : letter)) : text;

    /// <summary>Breaks text into lines at blanks; a word longer than a line is broken, never cut off.</summary>
    /// <param name="text">Any text.</param>
    /// <param name="width">Longest line, at least 1 character.</param>
    /// <returns>At least one line.</returns>
    public static IReadOnlyList<string> Wrap(string text, int width)
    {
        var lines = new List<string>();
        var line = new StringBuilder();
        foreach (var word in Clean(text).Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            var rest = word;
            if (line.Length > 0 && line.Length + 1 + rest.Length > width)
            {
                lines.Add(line.ToString());
                line.Clear();
            }

            for (; rest.Length > width; rest = rest[width..])
                lines.Add(rest[..width]);
            line.Append(line.Length > 0 ? " " : "").Append(rest);
        }

        lines.Add(line.ToString());
        return lines;
    }

    /// <summary>Writes a label with wrapped text beside it.</summary>
    /// <param name="output">Takes the lines.</param>
    /// <param name="label">Label of the first line.</param>
    /// <param name="labelWidth">Columns kept for the label; further lines are indented by as much.</param>
    /// <param name="text">The text.</param>
    /// <param name="width">Width of the page in characters.</param>
    public static void WriteLabelled(TextWriter output, string label, int labelWidth, string text, int width)
    {
        // A label that would run into the text stands on a line of its own.
        if (labelWidth > 0 && label.Length >= labelWidth)
        {
            output.WriteLine(label);
            label = "";
        }

        foreach (var line in Wrap(text, Math.Max(20, width - labelWidth)))
        {
            output.WriteLine((label.PadRight(labelWidth) + line).TrimEnd());
            label = "";
        }
    }
}

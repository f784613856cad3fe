using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>Joins remarks that end in the same words, so that twenty alike do not bury the one that matters. Nothing is left out.</summary>
internal static class RemarkGroups
{
    private const int FewestAlike = 3;
    private const int FewestCommonWords = 4;

    /// <summary>Joins remarks of the same code and severity.</summary>
    /// <param name="remarks">Remarks, most severe first.</param>
    /// <returns>Severities with texts, in the order of the first remark of each.</returns>
    public static IEnumerable<(Severity Severity, string Text)> Of(IEnumerable<Remark> remarks)
    {
        foreach (var group in remarks.GroupBy(remark => (remark.Severity, remark.Code, Ending(remark))))
        {
            var texts = group.Select(remark => remark.Text).ToArray();
            if (texts.Length < FewestAlike)
            {
                foreach (var text in texts)
                    yield return (group.Key.Severity, text);
                continue;
            }

            yield return (group.Key.Severity, Join(texts));
        }
    }

    private static string Ending(Remark remark) =>
        remark.Text.Split(' ') is { Length: > FewestCommonWords } words ? string.Join(' ', words[^FewestCommonWords..]) : remark.Text;

    private static string Join(string[] texts)
    {
        var split = texts.Select(text => text.Split(' ')).ToArray();
        var common = 0;
        while (split.All(words => words.Length > common + 1 && words[^(common + 1)] == split[0][^(common + 1)]))
            common++;
        var ending = string.Join(' ', split[0][^common..]);
        var beginnings = split.Select(words => string.Join(' ', words[..^common]));
        return FormattableString.Invariant($"{texts.Length} times \"... {ending}\": {string.Join(" | ", beginnings)}");
    }
}

namespace PartitionService.Cli.CaseFiles;

/// <summary>Guesses which word was meant.</summary>
internal static class NearestWord
{
    /// <summary>Finds the candidate with the fewest changed letters.</summary>
    /// <param name="word">The word as written.</param>
    /// <param name="candidates">Words that are allowed.</param>
    /// <returns>The nearest candidate, or null where none is near enough to be meant.</returns>
    public static string? Find(string word, IEnumerable<string> candidates)
    {
        // A third of the letters may be wrong; beyond that a guess misleads more than it helps.
        var best = candidates
            .Select(candidate => (candidate, distance: Distance(word.ToLowerInvariant(), candidate.ToLowerInvariant())))
            .Where(pair => pair.distance <= Math.Max(2, pair.candidate.Length / 3))
            .OrderBy(pair => pair.distance)
            .FirstOrDefault();
        return best.candidate;
    }

    /// <summary>Counts insertions, removals and replacements of letters between two words (Levenshtein 1966).</summary>
    private static int Distance(string left, string right)
    {
        // Keys are short; a file of a megabyte in one key must not cost its square in time.
        if (left.Length > 64)
            return int.MaxValue;
        var previous = Enumerable.Range(0, right.Length + 1).ToArray();
        for (var i = 1; i <= left.Length; i++)
        {
            var current = new int[right.Length + 1];
            current[0] = i;
            for (var j = 1; j <= right.Length; j++)
            {
                var replaced = previous[j - 1] + (left[i - 1] == right[j - 1] ? 0 : 1);
                current[j] = Math.Min(replaced, 1 + Math.Min(previous[j], current[j - 1]));
            }

            previous = current;
        }

        return previous[right.Length];
    }
}

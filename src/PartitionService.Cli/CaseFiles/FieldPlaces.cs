namespace PartitionService.Cli.CaseFiles;

/// <summary>Knows which key of the file gave which field of the request, so that refusals of the service point at a line.</summary>
internal sealed class FieldPlaces
{
    /// <summary>Path of the case in the request.</summary>
    internal const string Root = "vessel_case";

    private readonly Dictionary<string, (CaseNode Node, string Key)> places = new(StringComparer.Ordinal);

    /// <summary>Notes the place of a field.</summary>
    /// <param name="path">Path of the field, for example <c>vessel_case.charge[3].mass_kg</c>.</param>
    /// <param name="node">Where it stands.</param>
    /// <param name="key">Its key in words.</param>
    public void Note(string path, CaseNode node, string key) => places[path] = (node, key);

    /// <summary>Turns a violation of the service into an error of the file.</summary>
    /// <param name="path">Path of the field; one that the file does not give falls back to the nearest field around it.</param>
    /// <param name="description">What the service said.</param>
    /// <returns>The error with line, column and key.</returns>
    public CaseFileError Translate(string path, string description)
    {
        for (var around = path; around.Length > 0; around = Outer(around))
        {
            if (!places.TryGetValue(around, out var place))
                continue;
            // The field itself is not in the file: say which one is meant.
            var message = around == path ? description : $"{path[around.Length..].TrimStart('.')}: {description}";
            return new CaseFileError(place.Node.Line, place.Node.Column, place.Key, message);
        }

        return new CaseFileError(0, 0, path, description);
    }

    private static string Outer(string path)
    {
        var end = path.AsSpan().LastIndexOfAny('.', '[');
        return end < 0 ? "" : path[..end];
    }
}

namespace PartitionService.Cli.CaseFiles;

/// <summary>One mapping of a case file while it is read: knows its allowed keys and where each field of the request stands.</summary>
internal sealed class Section
{
    private readonly Dictionary<string, (ScalarNode Key, CaseNode Value)> entries = new(StringComparer.Ordinal);
    private readonly MappingNode node;
    private readonly string words;
    private readonly string path;
    private readonly List<CaseFileError> errors;
    private readonly FieldPlaces places;

    private Section(MappingNode node, string words, string path, List<CaseFileError> errors, FieldPlaces places)
    {
        this.node = node;
        this.words = words;
        this.path = path;
        this.errors = errors;
        this.places = places;
        places.Note(path, node, words);
    }

    /// <summary>Opens a mapping and reports its unknown and repeated keys.</summary>
    /// <param name="candidate">The node that should be a mapping.</param>
    /// <param name="words">Its key in words; empty at the root.</param>
    /// <param name="path">Its path in the request.</param>
    /// <param name="errors">Takes what is wrong.</param>
    /// <param name="places">Takes the places.</param>
    /// <param name="allowed">Allowed keys.</param>
    /// <returns>The section, or null where the node is not a mapping.</returns>
    public static Section? Open(
        CaseNode candidate, string words, string path, List<CaseFileError> errors, FieldPlaces places, params string[] allowed)
    {
        if (candidate is not MappingNode mapping)
        {
            errors.Add(new CaseFileError(candidate.Line, candidate.Column, words, allowed.Length == 0
                ? "This takes no numbers; write {} as its value."
                : $"Keys with values are expected here: {string.Join(", ", allowed)}."));
            return null;
        }

        var section = new Section(mapping, words, path, errors, places);
        foreach (var (key, value) in mapping.Entries)
            section.Admit(key, value, allowed);
        return section;
    }

    /// <summary>Opens a mapping inside this one.</summary>
    /// <param name="key">Its key.</param>
    /// <param name="allowed">Allowed keys inside it.</param>
    /// <returns>The section, or null where the key is absent or not a mapping.</returns>
    public Section? Inner(string key, params string[] allowed) =>
        Find(key) is { } value ? Open(value, Words(key), Path(key), errors, places, allowed) : null;

    /// <summary>Opens every item of a list of mappings.</summary>
    /// <param name="key">Key of the list.</param>
    /// <param name="allowed">Allowed keys of each item.</param>
    /// <returns>One section per item that is a mapping.</returns>
    public IEnumerable<Section> Items(string key, params string[] allowed)
    {
        if (Find(key) is not { } value)
            yield break;
        places.Note(Path(key), value, Words(key));
        if (value is not SequenceNode list)
        {
            Report(value, key, "A list is expected here, each item after a dash.");
            yield break;
        }

        for (var index = 0; index < list.Items.Count; index++)
        {
            var item = Open(list.Items[index], $"{Words(key)}, item {index + 1}", $"{Path(key)}[{index}]", errors, places, allowed);
            if (item is not null)
                yield return item;
        }
    }

    /// <summary>True where the key stands here, whatever its value.</summary>
    /// <param name="key">The key.</param>
    /// <returns>Whether it stands here.</returns>
    public bool Has(string key) => entries.ContainsKey(key);

    /// <summary>Gives the value of a key where it is one of a few words.</summary>
    /// <param name="key">The key.</param>
    /// <param name="allowed">The words.</param>
    /// <returns>True where the value is one of them.</returns>
    public bool IsWord(string key, params string[] allowed) =>
        entries.TryGetValue(key, out var entry) && entry.Value is ScalarNode { Text: var text } && allowed.Contains(text);

    /// <summary>Reads a finite number.</summary>
    /// <param name="key">The key.</param>
    /// <param name="field">Field of the request where it differs from the key.</param>
    /// <returns>The number, or null where it is absent or wrong.</returns>
    public double? Number(string key, string? field = null)
    {
        if (Scalar(key, field) is not { } scalar)
            return null;
        if (scalar.Quoted)
        {
            Report(scalar, key, $"{Quoted.Of(scalar.Text)} is text; write the number without quotation marks.");
            return null;
        }

        if (NumberReader.TryRead(scalar.Text, out var value, out var fault))
            return value;
        Report(scalar, key, fault);
        return null;
    }

    /// <summary>Reads a text of one or more characters.</summary>
    /// <param name="key">The key.</param>
    /// <returns>The text, or null where it is absent or wrong.</returns>
    public string? Text(string key)
    {
        if (Scalar(key, null) is not { } scalar)
            return null;
        if (scalar.Text.Any(char.IsControl))
        {
            Report(scalar, key, "The text must be one line without control characters.");
            return null;
        }

        return scalar.Text;
    }

    /// <summary>Reads true or false.</summary>
    /// <param name="key">The key.</param>
    /// <returns>The value, or null where it is absent or wrong.</returns>
    public bool? YesOrNo(string key)
    {
        if (Scalar(key, null) is not { } scalar)
            return null;
        if (scalar is { Quoted: false, Text: "true" or "false" })
            return scalar.Text == "true";
        Report(scalar, key, $"{Quoted.Of(scalar.Text)} is neither true nor false.");
        return null;
    }

    /// <summary>Reports a required key that is absent.</summary>
    /// <param name="key">The key.</param>
    public void Require(string key)
    {
        if (!Has(key))
            errors.Add(new CaseFileError(node.Line, node.Column, words, $"The key \"{key}\" is missing."));
    }

    /// <summary>Checks that exactly one of several keys stands here.</summary>
    /// <param name="keys">The keys.</param>
    /// <returns>The one key, or null where none or several stand here.</returns>
    public string? ExactlyOne(params string[] keys)
    {
        var present = keys.Where(Has).ToArray();
        if (present.Length == 1)
            return present[0];
        if (present.Length == 0)
        {
            errors.Add(new CaseFileError(node.Line, node.Column, words, $"One of these keys is missing: {string.Join(", ", keys)}."));
            return null;
        }

        var second = entries[present[1]].Key;
        Report(second, present[1], $"Only one of these keys may stand here: {string.Join(", ", present)}.");
        return null;
    }

    /// <summary>Finds the value of a key and reports one that is empty.</summary>
    /// <param name="key">The key.</param>
    /// <returns>The value, or null where the key is absent or has no value.</returns>
    public CaseNode? Find(string key)
    {
        if (!entries.TryGetValue(key, out var entry))
            return null;
        if (entry.Value is not ScalarNode { IsEmpty: true })
            return entry.Value;
        Report(entry.Key, key, "A value is missing.");
        return null;
    }

    private ScalarNode? Scalar(string key, string? field)
    {
        if (Find(key) is not { } value)
            return null;
        places.Note(Path(field ?? key), value, Words(key));
        if (value is ScalarNode scalar)
            return scalar;
        Report(value, key, "A single value is expected here.");
        return null;
    }

    private void Admit(ScalarNode key, CaseNode value, string[] allowed)
    {
        if (!allowed.Contains(key.Text))
        {
            // Guessing costs time, which a file of nothing but unknown keys would multiply; nobody reads a guess that is not shown.
            var guess = errors.Count < CaseFileReader.MostErrors ? NearestWord.Find(key.Text, allowed) : null;
            var hint = guess is { } nearest
                ? $"did you mean \"{nearest}\"?"
                : allowed.Length == 0 ? "no keys are known here, write {}." : $"known keys: {string.Join(", ", allowed)}.";
            errors.Add(new CaseFileError(key.Line, key.Column, words, $"Unknown key {Quoted.Of(key.Text)}; {hint}"));
        }
        else if (!entries.TryAdd(key.Text, (key, value)))
        {
            var first = FormattableString.Invariant($"line {entries[key.Text].Key.Line}");
            Report(key, key.Text, $"The key stands twice; it was given on {first} before.");
        }
    }

    private void Report(CaseNode place, string key, string message) =>
        errors.Add(new CaseFileError(place.Line, place.Column, Words(key), message));

    private string Words(string key) => words.Length == 0 ? key : $"{words}, {key}";

    private string Path(string key) => $"{path}.{key}";
}

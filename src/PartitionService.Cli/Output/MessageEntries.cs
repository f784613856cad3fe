using Google.Protobuf;
using Google.Protobuf.Reflection;

namespace PartitionService.Cli.Output;

/// <summary>Turns the plain fields of a message into records, so that a field added to the contract cannot be forgotten here.</summary>
internal static class MessageEntries
{
    // Longest ending first: "mass_ppm" must not be taken for "ppm" alone.
    private static readonly (string Ending, string Unit)[] Units =
    [
        ("gram_per_normal_cubic_metre", "g/Nm3"), ("normal_cubic_metre", "Nm3"), ("kilojoule_per_mol", "kJ/mol"), ("mass_percent", "mass %"),
        ("mass_ppm", "mass ppm"), ("kelvin", "K"), ("_atm", "atm"), ("_kg", "kg"), ("_mol", "mol"),
    ];

    /// <summary>Gives one record for each number and each word of a message; lists and inner messages are left to the caller.</summary>
    /// <param name="section">Section of the records.</param>
    /// <param name="subject">Subject of the records.</param>
    /// <param name="message">The message; null gives no records.</param>
    /// <returns>Records in the order of the contract.</returns>
    public static IEnumerable<CsvEntry> Of(string section, string subject, IMessage? message)
    {
        if (message is null)
            yield break;
        foreach (var field in message.Descriptor.Fields.InFieldNumberOrder().Where(field => !field.IsRepeated))
        {
            if (field.HasPresence && !field.Accessor.HasValue(message))
                continue;
            var value = field.Accessor.GetValue(message);
            switch (field.FieldType)
            {
                case FieldType.Double:
                    yield return new CsvEntry(section, subject, field.Name, (double)value, UnitOf(field.Name), "");
                    break;
                case FieldType.String when (string)value is { Length: > 0 } text && text != subject && field.Name != "name":
                    yield return new CsvEntry(section, subject, field.Name, null, "", text);
                    break;
            }
        }
    }

    private static string UnitOf(string field) =>
        field.StartsWith("log10_", StringComparison.Ordinal)
            ? "log10 atm"
            : Units.Where(unit => field.EndsWith(unit.Ending, StringComparison.Ordinal)).Select(unit => unit.Unit).FirstOrDefault("1");
}

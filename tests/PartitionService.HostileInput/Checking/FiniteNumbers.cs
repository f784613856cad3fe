using System.Collections;
using Google.Protobuf;
using Google.Protobuf.Reflection;

namespace PartitionService.HostileInput.Checking;

/// <summary>Looks through an answer for numbers that are none, and for shares that are no shares.</summary>
public static class FiniteNumbers
{
    private const double Rounding = 1e-9;

    /// <summary>The first bad number with its path; null where all are well.</summary>
    public static string? FindBad(IMessage message, string path = "")
    {
        foreach (var field in message.Descriptor.Fields.InDeclarationOrder())
        {
            if (field.FieldType is not (FieldType.Double or FieldType.Message))
                continue;
            var value = field.Accessor.GetValue(message);
            var here = path.Length == 0 ? field.Name : $"{path}.{field.Name}";
            var bad = value switch
            {
                double number => Judge(field.Name, number, here),
                IMessage inner => FindBad(inner, here),
                IList list => list.OfType<IMessage>().Select((item, index) => FindBad(item, FormattableString.Invariant($"{here}[{index}]")))
                    .FirstOrDefault(found => found is not null),
                _ => null,
            };
            if (bad is not null)
                return bad;
        }

        return null;
    }

    private static string? Judge(string field, double number, string path)
    {
        // The dilute limit of a conversion is a line that goes on beyond the pure substance: its fraction is no share.
        var share = field.EndsWith("_fraction", StringComparison.Ordinal) && path.StartsWith("answer.", StringComparison.Ordinal);
        return !double.IsFinite(number) || (share && number is < -Rounding or > 1 + Rounding)
            ? FormattableString.Invariant($"{path} is {number:R}")
            : null;
    }
}

using System.Text;

namespace PartitionService.Server.Errors;

/// <summary>Text of an exception for logs that must not hold payloads.</summary>
internal static class ExceptionText
{
    /// <summary>Types and stack traces from the outermost to the innermost exception, without their messages.</summary>
    public static string WithoutMessages(Exception exception)
    {
        var text = new StringBuilder();
        for (Exception? current = exception; current is not null; current = current.InnerException)
            text.Append(current.GetType().FullName).Append('\n').Append(current.StackTrace).Append('\n');
        return text.ToString();
    }
}

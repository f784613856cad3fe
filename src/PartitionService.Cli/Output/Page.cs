namespace PartitionService.Cli.Output;

/// <summary>How a page for reading is laid out.</summary>
/// <param name="Width">Width in characters.</param>
/// <param name="Bar">Marks of the bars.</param>
/// <param name="ShowData">True: list every datum that entered the answer.</param>
internal sealed record Page(int Width, SplitBar Bar, bool ShowData)
{
    /// <summary>Width where the output is not a terminal.</summary>
    public const int PipedWidth = 110;

    /// <summary>Narrowest page that the tables are made for.</summary>
    public const int NarrowestWidth = 60;

    /// <summary>Widest page; longer lines of prose are hard to read.</summary>
    public const int WidestWidth = 140;

    /// <summary>Lays out a page for where the output goes.</summary>
    /// <param name="isTerminal">True: the standard output is a terminal.</param>
    /// <param name="showData">True: list every datum.</param>
    /// <returns>A page.</returns>
    public static Page For(bool isTerminal, bool showData)
    {
        var width = isTerminal ? Math.Clamp(Console.WindowWidth - 1, NarrowestWidth, WidestWidth) : PipedWidth;
        var blocks = Console.OutputEncoding.WebName.StartsWith("utf-", StringComparison.OrdinalIgnoreCase);
        return new Page(width, blocks ? SplitBar.Blocks : SplitBar.Letters, showData);
    }
}

using System.Text;

namespace PartitionService.Cli.Output;

/// <summary>Draws how an element is split, one mark per phase, so that it reads without colour.</summary>
/// <param name="Metal">Mark of the metal.</param>
/// <param name="Slag">Mark of the slag.</param>
/// <param name="Gas">Mark of the gas.</param>
/// <param name="Dust">Mark of mechanical dust.</param>
/// <param name="Other">Mark of unburnt carbon and of what cannot be placed.</param>
internal sealed record SplitBar(char Metal, char Slag, char Gas, char Dust, char Other)
{
    /// <summary>Marks of full and shaded blocks.</summary>
    public static SplitBar Blocks { get; } = new('█', '▒', '·', '-', '?');

    /// <summary>Marks for terminals without block characters.</summary>
    public static SplitBar Letters { get; } = new('#', '=', '.', '-', '?');

    /// <summary>Explains the marks.</summary>
    public string Legend => $"bar: {Metal} metal  {Slag} slag  {Gas} gas  {Dust} dust  {Other} other";

    /// <summary>Draws one bar.</summary>
    /// <param name="cells">Length in characters.</param>
    /// <param name="metal">Share in the metal, in [0, 1].</param>
    /// <param name="slag">Share in the slag, in [0, 1].</param>
    /// <param name="gas">Share in the gas, in [0, 1].</param>
    /// <param name="dust">Share in mechanical dust, in [0, 1].</param>
    /// <returns>A bar of exactly that length; what the four shares leave open is elsewhere.</returns>
    public string Draw(int cells, double metal, double slag, double gas, double dust)
    {
        (char Mark, double Share)[] parts =
            [(Metal, metal), (Slag, slag), (Gas, gas), (Dust, dust), (Other, Math.Max(0, 1 - metal - slag - gas - dust))];
        var whole = parts.Select(part => (int)Math.Floor(cells * part.Share)).ToArray();
        // The cells that rounding down leaves over go to the largest remainders, so that every bar is equally long.
        var order = Enumerable.Range(0, parts.Length).OrderByDescending(i => (cells * parts[i].Share) - whole[i]).ToArray();
        for (var i = 0; whole.Sum() < cells; i++)
            whole[order[i % order.Length]]++;
        var bar = new StringBuilder(cells);
        for (var i = 0; i < parts.Length; i++)
            bar.Append(parts[i].Mark, whole[i]);
        return bar.Length > cells ? bar.ToString(0, cells) : bar.ToString();
    }
}

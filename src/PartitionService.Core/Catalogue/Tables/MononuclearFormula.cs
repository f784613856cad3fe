namespace PartitionService.Core.Catalogue.Tables;

/// <summary>A formula of one metal atom and one partner element, for example <c>AsO1.5</c> or <c>MgCl2</c>.</summary>
/// <param name="Text">The formula as written.</param>
/// <param name="Element">The metal.</param>
/// <param name="Partner">O or Cl.</param>
/// <param name="PartnerPerMetal">Partner atoms per metal atom.</param>
internal sealed record MononuclearFormula(string Text, string Element, string Partner, double PartnerPerMetal)
{
    /// <summary>Reads a formula whose first symbol is the metal, once, and whose second is one of the partners.</summary>
    public static MononuclearFormula Read(RowReader row, string column, params ReadOnlySpan<string> partners)
    {
        var formula = row.Formula(column);
        var atoms = formula.Atoms.ToArray();
        return atoms.Length == 2 && atoms[0].Value == 1 && partners.Contains(atoms[1].Key)
            ? new MononuclearFormula(formula.Text, atoms[0].Key, atoms[1].Key, atoms[1].Value)
            : throw row.Refuse(column, formula.Text, $"one metal atom followed by {string.Join(" or ", partners!)}");
    }
}

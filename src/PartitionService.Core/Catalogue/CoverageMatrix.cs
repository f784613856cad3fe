namespace PartitionService.Core.Catalogue;

/// <summary>What the catalogue knows and how well: solutes in metals, oxides and chlorides in slags, vapour species.</summary>
/// <remarks>
/// Only rows that count enter. A pair without a row is a cell that is missing, so that gaps can be seen and counted; the solvent
/// itself is no solute of its own metal, and carrier species (O2, CO, HCl ...) are vapours of no element.
/// </remarks>
/// <param name="Metals">Solvent by solute; sigma of ln gamma0.</param>
/// <param name="Slags">Slag family by element of the oxide or chloride; sigma of ln gamma, or of ln(K/gamma).</param>
/// <param name="Vapours">Vapour species by element; sigma of Delta G in J/mol. Its only row is <see cref="GasRow"/>.</param>
public sealed record CoverageMatrix(CoverageTable Metals, CoverageTable Slags, CoverageTable Vapours)
{
    /// <summary>Name of the only row of <see cref="Vapours"/>.</summary>
    public const string GasRow = "gas";

    private const string NoUnit = "1";

    /// <summary>Partners of an element in a vapour; a species of these alone belongs to no element of the charge.</summary>
    private static readonly HashSet<string> GasPartners = new(StringComparer.Ordinal) { "O", "S", "H", "N", "C", "Cl", "Br", "Ar" };

    /// <summary>Builds the tables of a catalogue.</summary>
    /// <param name="catalogue">The catalogue.</param>
    /// <returns>The tables; the same catalogue gives the same tables.</returns>
    public static CoverageMatrix Of(ThermochemicalCatalogue catalogue)
    {
        ArgumentNullException.ThrowIfNull(catalogue);
        return new CoverageMatrix(MetalsOf(catalogue), SlagsOf(catalogue), VapoursOf(catalogue));
    }

    private static CoverageTable MetalsOf(ThermochemicalCatalogue catalogue)
    {
        var known = catalogue.Data.OfType<InfiniteDilutionDatum>().Where(row => row.Preferred)
            .GroupBy(row => (row.Solvent, row.Solute))
            .Select(pair => pair.OrderBy(row => row.Access).ThenBy(row => row.SigmaLnGamma).Last())
            .Select(row => new CoverageCell(row.Solvent, row.Solute, row.Solute, Trust(row), row.SigmaLnGamma, row.Key));
        return Fill(NoUnit, known, (solvent, solute) => solvent != solute);
    }

    private static CoverageTable SlagsOf(ThermochemicalCatalogue catalogue)
    {
        var known = catalogue.Data.OfType<SlagActivityDatum>().Where(row => row.Preferred)
            .Select(row => new CoverageCell(row.Family, row.Element, row.Oxide, Trust(row), row.SigmaLnGamma, row.Key));
        return Fill(NoUnit, known, (_, _) => true);
    }

    private static CoverageTable VapoursOf(ThermochemicalCatalogue catalogue)
    {
        var known = catalogue.GasSpecies.SelectMany(row => row.Atoms.Keys
            .Where(element => !GasPartners.Contains(element))
            .Select(element => new CoverageCell(GasRow, element, row.Species, Trust(row), row.SigmaJoulePerMol, row.Key)));
        // Every element that some metal or slag may give off is a column, or an element without any vapour would not show.
        var elements = catalogue.Data
            .Where(row => row.Preferred)
            .Select(row => row switch { InfiniteDilutionDatum metal => metal.Solute, SlagActivityDatum slag => slag.Element, _ => "" })
            .Where(element => element.Length > 0 && !GasPartners.Contains(element));
        return Fill("J/mol", known, (_, _) => true, elements);
    }

    private static CoverageTable Fill(
        string sigmaUnit, IEnumerable<CoverageCell> known, Func<string, string, bool> isPossible, IEnumerable<string>? moreElements = null)
    {
        var cells = known.ToLookup(cell => (cell.Row, cell.Element));
        var rows = cells.Select(cell => cell.Key.Row).Distinct().Order(StringComparer.Ordinal).ToList();
        var elements = cells.Select(cell => cell.Key.Element).Concat(moreElements ?? []).Distinct().Order(StringComparer.Ordinal).ToList();
        var filled = from row in rows
                     from element in elements
                     where isPossible(row, element)
                     from cell in cells[(row, element)].OrderBy(cell => cell.Species, StringComparer.Ordinal)
                         .DefaultIfEmpty(new CoverageCell(row, element, "", CoverageTrust.Missing, null, ""))
                     select cell;
        return new CoverageTable(sigmaUnit, rows, elements, [.. filled]);
    }

    private static CoverageTrust Trust(Datum row) => (CoverageTrust)row.Access;
}

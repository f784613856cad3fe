using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Output;

/// <summary>Writes an answer as a long table: one number per record, for spreadsheets and scripts.</summary>
/// <remarks>
/// Columns: case (name), section (vessel, element, metal, metal_species, slag, slag_species, gas, gas_species, redox, solvent_loss,
/// allowance, remark, caution, datum), subject (element symbol, species, datum key or empty), quantity (name of the field in the
/// contract), value (number, or empty), unit ("1" where it has none), text (words, or empty). A quantity that the answer leaves
/// unset has no record.
/// </remarks>
internal static class AnswerCsv
{
    private static readonly string[] Header = ["case", "section", "subject", "quantity", "value", "unit", "text"];

    /// <summary>Writes the header and every record.</summary>
    /// <param name="output">Takes the text.</param>
    /// <param name="answer">The answer.</param>
    public static void Write(TextWriter output, ChargeAnswer answer)
    {
        Csv.WriteRecord(output, Header);
        foreach (var record in Records(answer))
        {
            var value = Csv.Number(record.Value);
            Csv.WriteRecord(output, answer.Name, record.Section, record.Subject, record.Quantity, value, record.Unit, record.Text);
        }

    }

    private static IEnumerable<CsvEntry> Records(ChargeAnswer answer) =>
    [
        .. MessageEntries.Of("vessel", "", answer),
        .. answer.Elements.SelectMany(element => MessageEntries.Of("element", element.Element, element)),
        .. Phase("metal", answer.Metal),
        .. Phase("slag", answer.Slag),
        .. MessageEntries.Of("gas", "", answer.Gas),
        .. (answer.Gas?.Species ?? []).SelectMany(species => MessageEntries.Of("gas_species", species.Species, species)),
        .. (answer.Gas?.Elements ?? []).SelectMany(element => MessageEntries.Of("gas", element.Element, element)),
        .. MessageEntries.Of("redox", "", answer.Redox),
        .. MessageEntries.Of("solvent_loss", answer.Solvent, answer.SolventLoss),
        .. MessageEntries.Of("allowance", "", answer.Allowances),
        .. (answer.Allowances?.StageEfficiencies ?? []).SelectMany(stage => MessageEntries.Of("allowance", stage.Element, stage)),
        .. answer.Remarks.Select(Entry),
        .. answer.Cautions.Select(Entry),
        .. answer.DataUsed.SelectMany(Datum),
    ];

    private static IEnumerable<CsvEntry> Phase(string section, PhaseReport? phase) =>
    [
        .. MessageEntries.Of(section, "", phase),
        .. (phase?.Elements ?? []).SelectMany(element => MessageEntries.Of(section, element.Element, element)),
        .. (phase?.Species ?? []).SelectMany(species => MessageEntries.Of($"{section}_species", species.Species, species)),
    ];

    private static CsvEntry Entry(Remark remark)
    {
        var subject = remark.Element.Length > 0 ? remark.Element : remark.Subject;
        return new CsvEntry("remark", subject, Words.Hyphenated(remark.Code), null, "", $"{Words.Of(remark.Severity)}: {remark.Text}");
    }

    private static CsvEntry Entry(Caution caution)
    {
        double? load = caution.HasLoadGramPerNormalCubicMetre ? caution.LoadGramPerNormalCubicMetre : null;
        return new CsvEntry("caution", caution.Substance, "load_gram_per_normal_cubic_metre", load, "g/Nm3", caution.Text);
    }

    private static IEnumerable<CsvEntry> Datum(DatumUse datum)
    {
        var access = datum.Overridden ? "given by the case" : Words.Of(datum.Access);
        var origin = string.Join("; ", [datum.Quantity, access, .. datum.SourceIds, .. datum.Flags]);
        yield return new CsvEntry("datum", datum.Key, "value", datum.Value, datum.Unit, origin);
        if (datum.HasSigma)
            yield return new CsvEntry("datum", datum.Key, "sigma", datum.Sigma, datum.Unit, "");
    }
}

/// <summary>One record without the name of the case.</summary>
/// <param name="Section">Part of the answer.</param>
/// <param name="Subject">Element, species, key or empty.</param>
/// <param name="Quantity">What the number is.</param>
/// <param name="Value">The number, or null.</param>
/// <param name="Unit">Its unit.</param>
/// <param name="Text">Words, or empty.</param>
internal sealed record CsvEntry(string Section, string Subject, string Quantity, double? Value, string Unit, string Text);

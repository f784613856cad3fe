using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

public sealed class CsvTableTests
{
    private static readonly string[] Columns = ["a", "b"];

    [Theory]
    [InlineData("", 0, "the file is empty")]
    [InlineData("a,b\n", 0, "the file has no rows")]
    [InlineData("a,c\n1,2\n", 1, "the header must be 'a,b'; missing: [b], unknown: [c]")]
    [InlineData("b,a\n1,2\n", 1, "the header must be 'a,b'; missing: [], unknown: []")]
    [InlineData("a,b\n1,2\n1,2,3\n", 3, "3 fields, 2 are expected")]
    [InlineData("a,b\n1,2\n\n1,2\n", 3, "1 fields, 2 are expected")]
    [InlineData("a,b\n1,x\"y\n", 2, "not well-formed")]
    public void Malformed_files_are_refused(string content, int line, string reason)
    {
        var refusal = Assert.Throws<CatalogueException>(() => CsvTable.Read("t.csv", content, Columns));
        Assert.Equal(("t.csv", line), (refusal.File, refusal.Line));
        Assert.StartsWith(reason, refusal.Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Quoted_fields_keep_commas_and_quotes_and_rows_know_their_line()
    {
        var rows = CsvTable.Read("t.csv", "a,b\n1,\"x, \"\"y\"\"\"\r\n2, z \n", Columns).Rows;
        Assert.Equal([2, 3], rows.Select(r => r.Line));
        Assert.Equal(["x, \"y\"", "z"], rows.Select(r => r.Text("b")));
    }

    [Fact]
    public void Missing_and_unknown_files_are_refused()
    {
        var files = CatalogueFiles.Embedded();
        files.Remove("chlorides.csv");
        Assert.Equal("chlorides.csv: the file is missing", Assert.Throws<CatalogueException>(() => CatalogueLoader.Load(files)).Message);
        files = CatalogueFiles.Embedded();
        files["notes.csv"] = "";
        var refusal = Assert.Throws<CatalogueException>(() => CatalogueLoader.Load(files));
        Assert.Equal("notes.csv: no table has this file name", refusal.Message);
    }

    [Theory]
    [InlineData("secondary copper / black copper", "secondary-copper-black-copper")]
    [InlineData("Steel EAF", "steel-eaf")]
    [InlineData("lead refining, softening slag", "lead-refining-softening-slag")]
    [InlineData("plain", "plain")]
    public void Slot_parts_are_hyphenated(string text, string expected) => Assert.Equal(expected, SlotKeys.Hyphenate(text));
}

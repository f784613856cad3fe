using System.Text.RegularExpressions;
using System.Xml.Linq;
using PartitionService.Core.Equilibrium;

namespace PartitionService.ArchitectureTests;

public sealed class LayoutTests
{
    private static readonly string[] Required =
    [
        ".ci", ".editorconfig", ".gitattributes", ".gitignore", ".dockerignore", "DEVELOPERS.md", "Directory.Build.props",
        "Directory.Packages.props", "Dockerfile", "LICENSE", "PartitionService.sln", "README.md", "deploy", "global.json", "protos", "src",
        "tests",
    ];

    [Fact]
    public void Top_level_holds_exactly_the_allowed_names()
    {
        Assert.Empty(Required.Except(Repository.TopLevelNames));
        Assert.Empty(Repository.TopLevelNames.Except(Required));
    }

    [Fact]
    public void Sources_stay_under_400_lines()
    {
        var sources = Repository.Sources("src").Concat(Repository.Sources("tests")).ToArray();
        Assert.NotEmpty(sources);
        Assert.Empty(sources.Where(file => File.ReadLines(file).Count() >= 400).Select(Repository.Relative));
    }

    [Fact]
    public void Every_public_type_of_the_core_has_a_summary()
    {
        var assembly = typeof(VesselCase).Assembly;
        var documented = XDocument.Load(Path.ChangeExtension(assembly.Location, ".xml")).Descendants("member")
            .Where(m => !string.IsNullOrWhiteSpace(m.Element("summary")?.Value))
            .Select(m => m.Attribute("name")!.Value).ToHashSet();
        var types = assembly.GetExportedTypes();
        Assert.NotEmpty(types);
        Assert.All(types, type => Assert.Contains($"T:{type.FullName!.Replace('+', '.')}", documented));
    }

    /// <summary>The pattern is put together so that this file does not match itself.</summary>
    [Fact]
    public void No_text_names_a_course()
    {
        var pattern = new Regex("lec" + "ture", RegexOptions.IgnoreCase);
        Assert.Empty(Repository.TextFiles.Where(file => pattern.IsMatch(File.ReadAllText(file))).Select(Repository.Relative));
    }

    [Theory]
    [InlineData("work")]
    [InlineData("tmp")]
    [InlineData("home")]
    [InlineData("root")]
    [InlineData("Users")]
    public void No_text_holds_a_path_of_one_machine(string folder)
    {
        var pattern = new Regex($"(^|[\\s\"'`=(:])(/{folder}/|[A-Z]:\\\\{folder}\\\\)[\\w.]", RegexOptions.Multiline);
        Assert.Empty(Repository.TextFiles.Where(file => pattern.IsMatch(File.ReadAllText(file))).Select(Repository.Relative));
    }
}

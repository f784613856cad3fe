using System.Reflection;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using PartitionService.Core.Equilibrium;

namespace PartitionService.ArchitectureTests;

/// <summary>Dependencies point one way: catalogue, thermodynamics, equilibrium; and no project looks back at one that builds on it.</summary>
public sealed class DependencyTests
{
    private static readonly Assembly Core = typeof(VesselCase).Assembly;

    private static readonly Dictionary<string, string[]> AllowedProjects = new()
    {
        ["PartitionService.Core"] = [],
        ["PartitionService.Contracts"] = [],
        ["PartitionService.Server"] = ["PartitionService.Core", "PartitionService.Contracts"],
        ["PartitionService.Client"] = ["PartitionService.Contracts"],
        ["PartitionService.Cli"] = ["PartitionService.Client", "PartitionService.Server", "PartitionService.Contracts"],
    };

    [Fact]
    public void Every_project_references_only_what_it_may()
    {
        var projects = Repository.Projects.ToArray();
        Assert.Contains(projects, p => p.EndsWith("PartitionService.Core.csproj", StringComparison.Ordinal));
        foreach (var project in projects)
        {
            var name = Path.GetFileNameWithoutExtension(project);
            Assert.True(AllowedProjects.ContainsKey(name), $"say in this test what {name} may reference");
            var referenced = XDocument.Load(project).Descendants("ProjectReference")
                .Select(r => Path.GetFileNameWithoutExtension(r.Attribute("Include")!.Value.Replace('\\', '/')));
            Assert.Empty(referenced.Except(AllowedProjects[name]));
        }
    }

    [Fact]
    public void The_core_references_no_transport_hosting_or_logging()
    {
        var names = Core.GetReferencedAssemblies().Select(a => a.Name!).ToArray();
        Assert.Contains("CsvHelper", names);
        Assert.DoesNotContain(
            names,
            name => Regex.IsMatch(name, "^(Grpc|Google|Microsoft|Serilog|PartitionService)\\.|^System\\.(Net|Console|IO\\.Pipes)|^Serilog$"));
    }

    [Theory]
    [InlineData("Catalogue", "Thermodynamics|Equilibrium")]
    [InlineData("Thermodynamics", "Equilibrium")]
    public void Sources_of_a_layer_name_no_layer_above(string layer, string above)
    {
        var sources = Repository.Sources($"src/PartitionService.Core/{layer}").ToArray();
        Assert.NotEmpty(sources);
        var pattern = new Regex($@"\b(PartitionService\.Core\.)?({above})\.[A-Z]|using PartitionService\.Core\.({above})\b");
        Assert.All(sources, file => Assert.DoesNotMatch(pattern, Code(file)));
    }

    [Theory]
    [InlineData("Catalogue", "Thermodynamics", "Equilibrium")]
    [InlineData("Thermodynamics", "Equilibrium")]
    public void Signatures_of_a_layer_show_no_type_of_a_layer_above(string layer, params string[] above)
    {
        const BindingFlags all = BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly;
        var types = Core.GetTypes().Where(t => In(t, layer)).ToArray();
        Assert.NotEmpty(types);
        var shown = types.SelectMany(t => t.GetMembers(all)).SelectMany(Shown).Concat(types.SelectMany(t => t.GetInterfaces()))
            .Concat(types.Select(t => t.BaseType).OfType<Type>()).SelectMany(Parts);
        Assert.DoesNotContain(shown, t => above.Any(name => In(t, name)));
    }

    private static bool In(Type type, string layer) =>
        type.Namespace is { } space && $"{space}.".StartsWith($"PartitionService.Core.{layer}.", StringComparison.Ordinal);

    private static IEnumerable<Type> Shown(MemberInfo member) => member switch
    {
        MethodInfo method => method.GetParameters().Select(p => p.ParameterType).Append(method.ReturnType),
        ConstructorInfo constructor => constructor.GetParameters().Select(p => p.ParameterType),
        FieldInfo field => [field.FieldType],
        PropertyInfo property => [property.PropertyType],
        _ => [],
    };

    private static IEnumerable<Type> Parts(Type type) =>
        type.GetGenericArguments().SelectMany(Parts).Append(type.HasElementType ? type.GetElementType()! : type);

    /// <summary>Text of a file without comments, so that documentation may point to any layer.</summary>
    private static string Code(string file) => Regex.Replace(File.ReadAllText(file), "//.*", "");
}

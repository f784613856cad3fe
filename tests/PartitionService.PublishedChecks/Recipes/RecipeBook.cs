using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Recomputes the quantity of a row; several figures where the row states a range of conditions.</summary>
/// <param name="row">The row.</param>
internal delegate IReadOnlyList<double> Recipe(PublishedRow row);

/// <summary>All recipes by name.</summary>
internal sealed class RecipeBook
{
    private readonly Dictionary<string, Recipe> recipes = new(StringComparer.Ordinal);

    /// <summary>Collects the recipes.</summary>
    public RecipeBook(Furnace furnace)
    {
        Deportment = new DeportmentRecipe(furnace);
        var groups = new IReadOnlyDictionary<string, Recipe>[]
        {
            new MetalRecipes(furnace).All,
            new PartitionRecipes(furnace).All,
            new VapourRecipes(furnace).All,
            new FractionRecipes(furnace).All,
            new OxygenRecipes(furnace).All,
            new SlagRecipes(furnace).All,
            new WorkedExampleRecipes(furnace).All,
        };
        foreach (var (name, recipe) in groups.SelectMany(group => group))
        {
            recipes.Add(name, recipe);
        }
    }

    /// <summary>The recipe with three figures.</summary>
    public DeportmentRecipe Deportment { get; }

    /// <summary>The recipe with this name.</summary>
    public Recipe this[string name] => recipes[name];
}

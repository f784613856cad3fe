using PartitionService.Core.Catalogue.Tables;

namespace PartitionService.Core.Catalogue;

/// <summary>All rows with their places, before the checks that need more than one row.</summary>
internal sealed record CatalogueDraft(
    IReadOnlyDictionary<string, Source> Sources,
    IReadOnlyList<Located<Element>> Elements,
    IReadOnlyList<Located<SlagFamily>> Families,
    IReadOnlyList<Located<SlagComponentRow>> Components,
    IReadOnlyList<Located<Datum>> Data)
{
    /// <summary>Data of one kind with their places.</summary>
    public IEnumerable<(T Datum, Located<Datum> Place)> OfKind<T>()
        where T : Datum
    {
        foreach (var row in Data)
        {
            if (row.Value is T datum)
                yield return (datum, row);
        }
    }
}

using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Errors;

namespace PartitionService.Server.Paging;

/// <summary>Cuts lists into pages.</summary>
internal sealed class Pager(ThermochemicalCatalogue catalogue)
{
    /// <summary>Page size where none is asked for.</summary>
    public const int DefaultSize = 100;

    /// <summary>Largest page size.</summary>
    public const int MaximumSize = 1000;

    /// <summary>Checks a page size.</summary>
    public static void CheckSize(int pageSize, ICollection<CaseViolation> violations) =>
        FieldChecks.Range(violations, "page_size", pageSize, 0, MaximumSize);

    /// <summary>Takes the page that a token names.</summary>
    /// <param name="all">All entries, in an order that the catalogue fixes.</param>
    /// <param name="pageSize">Checked page size; 0: the default.</param>
    /// <param name="token">Token as sent; empty: from the start.</param>
    /// <param name="list">List and filter as text.</param>
    /// <exception cref="ServiceException">The token was not issued for this list, filter and catalogue.</exception>
    public Page<T> Take<T>(IReadOnlyList<T> all, int pageSize, string token, string list)
    {
        var offset = 0;
        if (token.Length > 0 && (!PageToken.TryRead(token, catalogue.Digest, list, out offset) || offset >= all.Count))
            throw ServiceErrors.InvalidPageToken(token);
        T[] entries = [.. all.Skip(offset).Take(pageSize == 0 ? DefaultSize : pageSize)];
        var next = offset + entries.Length;
        return new Page<T>(entries, next < all.Count ? PageToken.Write(catalogue.Digest, list, next) : "", all.Count);
    }
}

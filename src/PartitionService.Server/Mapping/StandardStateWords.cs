using PartitionService.Core.Catalogue;

namespace PartitionService.Server.Mapping;

/// <summary>Standard states in words.</summary>
internal static class StandardStateWords
{
    /// <summary>The pure substance with activity 1, for example "pure liquid".</summary>
    public static string Of(StandardState state) => state switch
    {
        StandardState.Liquid => "pure liquid",
        StandardState.Solid => "pure solid",
        StandardState.Graphite => "graphite",
        StandardState.MonatomicGas => "monatomic gas, 1 atm",
        StandardState.HalfDiatomicGas => "1/2 X2 gas, 1 atm",
        StandardState.ProductOnly => "none, ln(K/gamma) of the product",
        _ => throw new ArgumentOutOfRangeException(nameof(state), state, "unknown state"),
    };

    /// <summary>State that a caller's ln gamma0 refers to, as the contract fixes it by element.</summary>
    public static string ForCallersNumber(string element) => Of(element switch
    {
        "O" or "S" or "H" or "N" => StandardState.HalfDiatomicGas,
        "C" => StandardState.Graphite,
        _ => StandardState.Liquid,
    });
}

using System.Collections.Frozen;

namespace PartitionService.Core.Catalogue;

/// <summary>The words that stand for enumeration members in the catalogue files.</summary>
internal static class Words
{
    /// <summary>Ways in which a number was obtained.</summary>
    public static FrozenDictionary<string, Access> Access { get; } = Table(
        ("read", Catalogue.Access.Read),
        ("abstract", Catalogue.Access.Abstract),
        ("derived", Catalogue.Access.Derived),
        ("memory", Catalogue.Access.Memory),
        ("assumed", Catalogue.Access.Assumed));

    /// <summary>Yes and no.</summary>
    public static FrozenDictionary<string, bool> YesNo { get; } = Table(("yes", true), ("no", false));

    /// <summary>States of a metal on the left side of an oxidation.</summary>
    public static FrozenDictionary<string, StandardState> MetalState { get; } = Table(
        ("liquid", StandardState.Liquid),
        ("solid", StandardState.Solid),
        ("monatomic-gas", StandardState.MonatomicGas),
        ("half-diatomic-gas", StandardState.HalfDiatomicGas));

    /// <summary>States of a solute.</summary>
    public static FrozenDictionary<string, StandardState> SoluteState { get; } = Table(
        ("liquid", StandardState.Liquid),
        ("solid", StandardState.Solid),
        ("graphite", StandardState.Graphite),
        ("monatomic-gas", StandardState.MonatomicGas),
        ("half-diatomic-gas", StandardState.HalfDiatomicGas));

    /// <summary>States of a condensed oxide or salt.</summary>
    public static FrozenDictionary<string, StandardState> CondensedState { get; } = Table(
        ("liquid", StandardState.Liquid),
        ("solid", StandardState.Solid));

    /// <summary>States of the oxide that a slag row refers to.</summary>
    public static FrozenDictionary<string, StandardState> SlagState { get; } = Table(
        ("liquid", StandardState.Liquid),
        ("solid", StandardState.Solid),
        ("product-only", StandardState.ProductOnly));

    /// <summary>Composition variables of slag rows.</summary>
    public static FrozenDictionary<string, SlagVariable> SlagVariable { get; } = Table(
        ("cao-mass-percent", Catalogue.SlagVariable.CaOMassPercent),
        ("cao-to-sio2-mass-ratio", Catalogue.SlagVariable.CaOToSiO2MassRatio),
        ("iron-to-sio2-mass-ratio", Catalogue.SlagVariable.IronToSiO2MassRatio),
        ("phosphorus-basicity-sum", Catalogue.SlagVariable.PhosphorusBasicitySum));

    /// <summary>Origins of slag rows.</summary>
    public static FrozenDictionary<string, string> SlagKind { get; } = Table(
        ("calibrated", "calibrated"),
        ("anchored", "anchored"),
        ("literature", "literature"),
        ("assumed", "assumed"));

    private static FrozenDictionary<string, T> Table<T>(params (string Word, T Value)[] entries) =>
        entries.ToFrozenDictionary(e => e.Word, e => e.Value, StringComparer.Ordinal);
}

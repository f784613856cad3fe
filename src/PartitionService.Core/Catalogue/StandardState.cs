namespace PartitionService.Core.Catalogue;

/// <summary>Pure substance that has activity 1, at 1 atm.</summary>
public enum StandardState
{
    /// <summary>Pure liquid, also below its melting point (supercooled).</summary>
    Liquid,

    /// <summary>Pure solid, stable form.</summary>
    Solid,

    /// <summary>Graphite; carbon only.</summary>
    Graphite,

    /// <summary>Monatomic ideal gas at 1 atm (Ca, Mg in iron and the gas reference of volatile metals).</summary>
    MonatomicGas,

    /// <summary>Half a mole of the diatomic ideal gas at 1 atm (O, S, H, N, P, Cl, Br).</summary>
    HalfDiatomicGas,

    /// <summary>No standard state: the row gives ln(K/gamma) of the product, because K alone is unknown.</summary>
    ProductOnly,
}

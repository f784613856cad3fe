namespace PartitionService.Core.Catalogue;

/// <summary>Composition variable of a slag that an activity coefficient may depend on.</summary>
public enum SlagVariable
{
    /// <summary>CaO in mass % of the slag.</summary>
    CaOMassPercent,

    /// <summary>CaO/SiO2, mass ratio.</summary>
    CaOToSiO2MassRatio,

    /// <summary>Fe/SiO2, mass ratio of total iron to silica.</summary>
    IronToSiO2MassRatio,

    /// <summary>
    /// 22 N(CaO) + 15 N(MgO) + 13 N(MnO) + 12 N(FeO) - 2 N(SiO2), mole fractions of whole oxides (Turkdogan and Pearson 1953).
    /// </summary>
    PhosphorusBasicitySum,
}

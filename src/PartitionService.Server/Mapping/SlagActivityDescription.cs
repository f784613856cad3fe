using PartitionService.Core.Catalogue;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Words and formula of an activity coefficient in slag, which may depend on the slag's composition.</summary>
internal static class SlagActivityDescription
{
    /// <summary>Describes a row; its value leaves the composition term out.</summary>
    public static DatumDescription Of(SlagActivityDatum row)
    {
        var product = row.OxideState == StandardState.ProductOnly;
        var words = product
            ? $"ln(K/gamma) of {row.Oxide} in {row.Family} slag, metal referred to {StandardStateWords.Of(row.MetalState)}"
            : $"ln gamma of {row.Oxide} in {row.Family} slag, referred to {StandardStateWords.Of(row.OxideState)}";
        var left = product ? "ln(K/gamma)" : "ln gamma";
        return new(
            Wire.DatumKind.SlagActivity,
            $"{words}; {row.Kind}",
            $"{left} = {FormulaText.InverseTemperature(row.Constant, row.InverseTemperatureKelvin)}{Slope(row)}",
            "1",
            row.SigmaLnGamma,
            row.LnGamma,
            row.ChlorinePerMetal > 0 ? [row.Element, "Cl"] : [row.Element]);
    }

    private static string Slope(SlagActivityDatum row)
    {
        if (row.Variable is not { } variable || row.Slope == 0)
            return "";
        var name = variable switch
        {
            SlagVariable.CaOMassPercent => "mass % CaO",
            SlagVariable.CaOToSiO2MassRatio => "CaO/SiO2",
            SlagVariable.IronToSiO2MassRatio => "Fe/SiO2",
            SlagVariable.PhosphorusBasicitySum => "sum(basicity)",
            _ => throw new ArgumentOutOfRangeException(nameof(row), variable, "unknown variable"),
        };
        return $"{FormulaText.Signed(row.Slope)} ({name}{FormulaText.Signed(-row.VariableReference)})";
    }
}

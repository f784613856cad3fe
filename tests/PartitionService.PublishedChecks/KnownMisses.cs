namespace PartitionService.PublishedChecks;

/// <summary>Scored rows that are known not to hold; README.md says why at length.</summary>
internal static class KnownMisses
{
    /// <summary>Reason by id.</summary>
    public static IReadOnlyDictionary<string, string> Reasons { get; } = new Dictionary<string, string>(StringComparer.Ordinal)
    {
        ["g0-051"] = "model: no self-interaction of zinc in lead, so the value at saturation equals that at infinite dilution",
        ["pr-001"] = "model: the source reads bismuth as atomic, without a slope in pO2; the catalogue dissolves BiO1.5, slope 0.75",
        ["pr-003"] = "datum: the source warns of a factor of 10; the catalogue's AsO1.5 rests on later measurements, slope 0.75",
        ["pr-028"] = "model: the coefficients of Rh, Pd, Pt oxides do not depend on SiO2 or CaO of the Cu2O slag",
        ["pr-032"] = "model: the coefficient of PbO does not depend on soda",
        ["pr-049"] = "model: the coefficient of MnO in steelmaking slag does not depend on basicity",
        ["pr-078"] = "model: the coefficient of PbO in lime-silica-alumina slag does not depend on basicity",
        ["vo-016"] = "model: the catalogue has no PbTe vapour, and elemental tellurium is held firmly by lead",
        ["vo-028"] = "conditions: pumped batch of unknown time; a closed stage at the stated pressure forms no vapour",
        ["vo-050"] = "datum: handbooks differ by 45 K on the boiling point of indium",
        ["vo-058"] = "datum: the vapour line of germanium is extended beyond its range and lies 68 K low",
        ["de-069"] = "model: only trivalent indium oxide; the monovalent oxide and its vapour carry indium at low pO2",
        ["ft-041"] = "conditions: gas and slag of the fact are not stated; at log10 pO2 -7 (start of refining) 12 % zinc is left",
        ["fc-071"] = "model: first-order self-interaction of carbon, bounded by the product, never reaches the activity of graphite",
    };
}

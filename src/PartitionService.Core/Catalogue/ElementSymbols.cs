using System.Collections.Frozen;

namespace PartitionService.Core.Catalogue;

/// <summary>The 118 element symbols approved by IUPAC, in the order of the atomic number.</summary>
public static class ElementSymbols
{
    /// <summary>Symbols from hydrogen (index 0) to oganesson (index 117).</summary>
    public static IReadOnlyList<string> InOrder { get; } =
        ("H He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Br Kr "
        + "Rb Sr Y Zr Nb Mo Tc Ru Rh Pd Ag Cd In Sn Sb Te I Xe Cs Ba La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm Yb Lu "
        + "Hf Ta W Re Os Ir Pt Au Hg Tl Pb Bi Po At Rn Fr Ra Ac Th Pa U Np Pu Am Cm Bk Cf Es Fm Md No Lr "
        + "Rf Db Sg Bh Hs Mt Ds Rg Cn Nh Fl Mc Lv Ts Og").Split(' ');

    private static readonly FrozenSet<string> Known = InOrder.ToFrozenSet(StringComparer.Ordinal);

    /// <summary>True where <paramref name="symbol"/> is one of the 118 symbols, letter case included.</summary>
    public static bool Contains(string symbol) => Known.Contains(symbol);
}

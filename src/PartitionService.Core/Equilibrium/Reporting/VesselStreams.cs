using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Equilibrium.Charging;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>What leaves the vessel, element by element in mol: equilibrium, bypass, inert slag, dust and entrainment added up.</summary>
internal sealed class VesselStreams
{
    private readonly IReadOnlyDictionary<string, Element> elements;

    /// <summary>Adds up the streams of a solved case.</summary>
    public VesselStreams(
        VesselAssembly assembly, EquilibriumState state, PracticeAllowances allowances, IReadOnlyDictionary<string, Element> elements)
    {
        this.elements = elements;
        var account = assembly.Account;
        EquilibriumMetal = state.Elements(PhaseKind.Metal);
        EquilibriumSlag = state.Elements(PhaseKind.Slag);
        AddAll(EquilibriumSlag, account.Inert, 1);

        // Where sulfide takes nearly all oxide ions, rounding may leave less than none.
        EquilibriumSlag.Add("O", Math.Max(0, -EquilibriumSlag["O"]));
        Gas = state.Elements(PhaseKind.Gas);
        Carbon = state.Elements(PhaseKind.Carbon);
        Dust = account.Dust;
        var clean = new ElementLedger();
        AddAll(clean, EquilibriumMetal, 1);
        AddAll(clean, account.Bypass[ChargeOrigin.Metal], 1);
        var slag = new ElementLedger();
        AddAll(slag, EquilibriumSlag, 1);
        AddAll(assembly.Family is null ? Unplaced : slag, account.Bypass[ChargeOrigin.Slag], 1);
        AddAll(Carbon, account.Bypass[ChargeOrigin.Carbon], 1);
        foreach (var element in account.Reacting.Elements)
        {
            if (state.LnActivity(element) is null)
            {
                Unplaced.Add(element, account.Reacting[element]);
            }
        }

        Entrain(clean, slag, allowances, assembly.Family);
        Supply = state.LnActivity("O") is null || assembly.FixedOxygen is null
            ? 0
            : Held(state, "O") - account.Reacting["O"];
    }

    /// <summary>Metal at equilibrium, mol.</summary>
    public ElementLedger EquilibriumMetal { get; }

    /// <summary>Slag at equilibrium with its inert part, mol.</summary>
    public ElementLedger EquilibriumSlag { get; }

    /// <summary>Leaving metal, mol.</summary>
    public ElementLedger Metal { get; } = new();

    /// <summary>Leaving slag, mol.</summary>
    public ElementLedger Slag { get; } = new();

    /// <summary>Leaving gas, mol.</summary>
    public ElementLedger Gas { get; }

    /// <summary>Unburnt carbon, mol.</summary>
    public ElementLedger Carbon { get; }

    /// <summary>Mechanical dust, mol.</summary>
    public ElementLedger Dust { get; }

    /// <summary>What cannot be placed, mol.</summary>
    public ElementLedger Unplaced { get; } = new();

    /// <summary>Oxygen atoms supplied beyond the charge, mol; negative: removed.</summary>
    public double Supply { get; }

    /// <summary>Metal droplets in the leaving slag, kg.</summary>
    public double MetalInSlagKg { get; private set; }

    /// <summary>Slag in the leaving metal, kg.</summary>
    public double SlagInMetalKg { get; private set; }

    /// <summary>Share of the clean metal that the slag carries.</summary>
    public double MetalShareInSlag { get; private set; }

    /// <summary>Share of the clean slag that the metal carries.</summary>
    public double SlagShareInMetal { get; private set; }

    /// <summary>Droplets asked for, mass % of the slag.</summary>
    public double MetalInSlagMassPercent { get; private set; }

    /// <summary>True where the droplets or the slag asked for exceed what there is.</summary>
    public bool EntrainmentLimited { get; private set; }

    /// <summary>Mass of one element in a ledger, kg.</summary>
    public double MassKg(ElementLedger ledger, string element) => ledger[element] * elements[element].AtomicMassGramPerMol / 1000;

    private static double Held(EquilibriumState state, string element) =>
        Enum.GetValues<PhaseKind>().Sum(phase => state.Elements(phase)[element]);

    private static void AddAll(ElementLedger target, ElementLedger source, double factor)
    {
        foreach (var element in source.Elements)
        {
            target.Add(element, factor * source[element]);
        }
    }

    /// <summary>
    /// Droplets e_M and slag e_S carried over satisfy e_M = p (m_S - e_S + e_M) and e_S = q (m_M - e_M + e_S), with p and q the mass
    /// fractions in the leaving phases: two linear equations.
    /// </summary>
    private void Entrain(ElementLedger metal, ElementLedger slag, PracticeAllowances allowances, SlagFamily? family)
    {
        MetalInSlagMassPercent = allowances.MetalInSlagTypical
            ? family?.TypicalEntrainedMetalMassPercent ?? 0
            : allowances.MetalInSlagMassPercent;
        var p = MetalInSlagMassPercent / 100;
        var q = allowances.SlagInMetalMassPercent / 100;
        var metalMass = metal.MassKg(elements);
        var slagMass = slag.MassKg(elements);
        double toSlag = 0, toMetal = 0;
        if (metalMass > 0 && slagMass > 0 && (p > 0 || q > 0))
        {
            var determinant = 1 - p - q;
            toSlag = determinant > 0 ? p * (((1 - q) * slagMass) - (q * metalMass)) / determinant : metalMass;
            toMetal = determinant > 0 ? q * (((1 - p) * metalMass) - (p * slagMass)) / determinant : slagMass;
            var limitedSlag = Math.Clamp(toSlag, 0, metalMass);
            var limitedMetal = Math.Clamp(toMetal, 0, slagMass);
            EntrainmentLimited = limitedSlag != toSlag || limitedMetal != toMetal;
            toSlag = limitedSlag;
            toMetal = limitedMetal;
        }

        MetalInSlagKg = toSlag;
        SlagInMetalKg = toMetal;
        MetalShareInSlag = metalMass > 0 ? toSlag / metalMass : 0;
        SlagShareInMetal = slagMass > 0 ? toMetal / slagMass : 0;
        AddAll(Metal, metal, 1 - MetalShareInSlag);
        AddAll(Metal, slag, SlagShareInMetal);
        AddAll(Slag, slag, 1 - SlagShareInMetal);
        AddAll(Slag, metal, MetalShareInSlag);
    }
}

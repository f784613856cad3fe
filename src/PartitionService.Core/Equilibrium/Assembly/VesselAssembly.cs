using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Turns a valid case into the solver's problem: charge, solvent, species, oxygen potential.</summary>
internal sealed class VesselAssembly
{
    /// <summary>The charge, split.</summary>
    public required ChargeAccount Account { get; init; }

    /// <summary>The problem.</summary>
    public required AssembledCase Assembled { get; init; }

    /// <summary>Numbers that entered.</summary>
    public required DatumLedger Ledger { get; init; }

    /// <summary>Solvent.</summary>
    public required string Solvent { get; init; }

    /// <summary>Slag family; null without a slag.</summary>
    public required SlagFamily? Family { get; init; }

    /// <summary>Slag constants that depend on the slag's composition; null without a slag.</summary>
    public required SlagTerms? Terms { get; init; }

    /// <summary>1/2 ln pO2 where the statement fixes it at once.</summary>
    public required double? FixedOxygen { get; init; }

    /// <summary>What the fixed potential depends on; null with a closed balance and with dissolved oxygen.</summary>
    public required FixedPotential? Potential { get; init; }

    /// <summary>Splits one more charge item as the charge itself was split.</summary>
    public required Func<ChargeItem, ChargeAccount> Split { get; init; }

    /// <summary>True where the stated oxygen potential leaves no room for a metal.</summary>
    public required bool MetalExcluded { get; init; }
}

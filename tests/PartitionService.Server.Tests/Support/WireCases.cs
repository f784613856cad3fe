using PartitionService.Contracts.V1;

namespace PartitionService.Server.Tests.Support;

/// <summary>Vessels for requests.</summary>
public static class WireCases
{
    /// <summary>Copper with a little lead and tin under an iron silicate slag; a valid case without surprises.</summary>
    public static VesselCase BlackCopper(string name = "black copper") => new()
    {
        Name = name,
        TemperatureKelvin = 1573,
        Metal = new MetalBath { Solvent = "Cu" },
        Slag = new SlagBath { Family = "iron-silicate" },
        Gas = new GasAtmosphere(),
        Oxygen = new OxygenStatement { Log10Po2Atm = -8 },
        Charge =
        {
            new ChargeItem { Formula = "Cu", MassKg = 1000 },
            new ChargeItem { Formula = "Pb", MassKg = 10 },
            new ChargeItem { Formula = "Sn", MassKg = 5 },
            new ChargeItem { Formula = "FeO", MassKg = 300 },
            new ChargeItem { Formula = "SiO2", MassKg = 150 },
            new ChargeItem { Formula = "N2", VolumeNormalCubicMetre = 50 },
        },
    };

    public static SolveChargeRequest Request(string name = "black copper") => new() { VesselCase = BlackCopper(name) };
}

namespace PartitionService.Core.Equilibrium;

/// <summary>What is known about oxygen in the vessel; exactly one of the nested kinds.</summary>
public abstract record OxygenStatement
{
    private OxygenStatement()
    {
    }

    /// <summary>Fixed oxygen partial pressure.</summary>
    /// <param name="Log10PressureAtm">log10 of pO2 in atm, in [-40, 2].</param>
    public sealed record Pressure(double Log10PressureAtm) : OxygenStatement;

    /// <summary>CO2/CO ratio of a controlling gas.</summary>
    /// <param name="Ratio">Volume ratio, in [1e-12, 1e12].</param>
    public sealed record CarbonDioxideToMonoxide(double Ratio) : OxygenStatement;

    /// <summary>H2O/H2 ratio of a controlling gas.</summary>
    /// <param name="Ratio">Volume ratio, in [1e-12, 1e12].</param>
    public sealed record WaterToHydrogen(double Ratio) : OxygenStatement;

    /// <summary>Equilibrium of a metal with one of its oxides, each referred to its stable pure state.</summary>
    /// <param name="Oxide">Oxide per metal atom or as a whole oxide, for example <c>FeO</c> or <c>Cu2O</c>.</param>
    /// <param name="OxideActivity">Activity of the oxide, in [1e-12, 1].</param>
    /// <param name="MetalActivity">Activity of the metal, in [1e-12, 1].</param>
    public sealed record MetalOxidePair(string Oxide, double OxideActivity = 1, double MetalActivity = 1) : OxygenStatement;

    /// <summary>Oxygen dissolved in the metal.</summary>
    /// <param name="MassPpm">Mass ppm of the metal, in [1e-6, 50000].</param>
    public sealed record Dissolved(double MassPpm) : OxygenStatement;

    /// <summary>Closed balance: all oxygen that goes in is accounted for.</summary>
    public sealed record Closed : OxygenStatement;

    /// <summary>Nothing was stated; always a violation.</summary>
    public sealed record Unstated : OxygenStatement;
}

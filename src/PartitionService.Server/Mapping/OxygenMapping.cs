using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns the statement about oxygen of a request into one of the core.</summary>
internal static class OxygenMapping
{
    /// <summary>Maps one statement; null and an empty choice become Unstated.</summary>
    public static OxygenStatement ToStatement(Wire.OxygenStatement? sent) => sent?.StatementCase switch
    {
        Wire.OxygenStatement.StatementOneofCase.Log10Po2Atm => new OxygenStatement.Pressure(sent.Log10Po2Atm),
        Wire.OxygenStatement.StatementOneofCase.Co2ToCoRatio => new OxygenStatement.CarbonDioxideToMonoxide(sent.Co2ToCoRatio),
        Wire.OxygenStatement.StatementOneofCase.H2OToH2Ratio => new OxygenStatement.WaterToHydrogen(sent.H2OToH2Ratio),
        Wire.OxygenStatement.StatementOneofCase.MetalOxidePair => ToPair(sent.MetalOxidePair),
        Wire.OxygenStatement.StatementOneofCase.DissolvedOxygenMassPpm => new OxygenStatement.Dissolved(sent.DissolvedOxygenMassPpm),
        Wire.OxygenStatement.StatementOneofCase.ClosedBalance => new OxygenStatement.Closed(),
        _ => new OxygenStatement.Unstated(),
    };

    private static OxygenStatement.MetalOxidePair ToPair(Wire.MetalOxidePair sent)
    {
        var pair = new OxygenStatement.MetalOxidePair(sent.Oxide);
        if (sent.HasOxideActivity)
            pair = pair with { OxideActivity = sent.OxideActivity };
        return sent.HasMetalActivity ? pair with { MetalActivity = sent.MetalActivity } : pair;
    }
}

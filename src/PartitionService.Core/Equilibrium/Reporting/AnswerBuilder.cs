using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Equilibrium.Charging;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Turns a solved case into the answer.</summary>
/// <param name="vesselCase">The case.</param>
/// <param name="catalogue">The catalogue.</param>
/// <param name="assembly">The assembled case.</param>
/// <param name="state">The solution.</param>
internal sealed class AnswerBuilder(
    VesselCase vesselCase, ThermochemicalCatalogue catalogue, VesselAssembly assembly, EquilibriumState state)
{
    private readonly VesselStreams streams = new(assembly, state, vesselCase.Allowances, catalogue.Elements);

    /// <summary>Builds the answer.</summary>
    public VesselAnswer Build()
    {
        foreach (var term in assembly.Terms?.All ?? [])
        {
            assembly.Ledger.Adjust(term.Slot, term.DatumValue);
        }

        var elements = Distributions(out var balanceError);
        var gas = GasReporter.Report(state, streams, vesselCase.PressureAtm, catalogue.Elements);
        var data = UsedData();
        var context = new ReportContext(vesselCase, catalogue, assembly, state, streams, elements, gas, data);
        return new VesselAnswer
        {
            Name = vesselCase.Name,
            CatalogueDigest = catalogue.Digest,
            TemperatureKelvin = vesselCase.TemperatureKelvin,
            PressureAtm = vesselCase.PressureAtm,
            Solvent = assembly.Solvent,
            SlagFamily = vesselCase.SlagFamily,
            Elements = elements,
            Metal = CondensedPhaseReporter.Report(PhaseKind.Metal, streams.Metal, state, catalogue.Elements),
            Slag = assembly.Family is null ? null : CondensedPhaseReporter.Report(PhaseKind.Slag, streams.Slag, state, catalogue.Elements),
            Gas = gas,
            UnburntCarbonKg = streams.Carbon.MassKg(catalogue.Elements),
            MechanicalDustKg = streams.Dust.MassKg(catalogue.Elements),
            Redox = RedoxReporter.Report(context),
            SolventLoss = Loss(),
            Allowances = Allowances(),
            Remarks = RemarkRules.All(context),
            Cautions = CautionRules.All(context),
            DataUsed = data,
            WeakestAccess = data.Any(use => use.Access is not null) ? data.Max(use => use.Access) : null,
            Solution = new SolutionReport(state.Iterations, state.ActivityPasses, balanceError, state.UsedBarrier),
        };
    }

    private List<ElementDistribution> Distributions(out double largestError)
    {
        largestError = 0;
        var metalMass = streams.Metal.MassKg(catalogue.Elements);
        var slagMass = streams.Slag.MassKg(catalogue.Elements);
        var equilibriumMetalMass = streams.EquilibriumMetal.MassKg(catalogue.Elements);
        var equilibriumSlagMass = streams.EquilibriumSlag.MassKg(catalogue.Elements);
        var rows = new List<ElementDistribution>();
        var symbols = assembly.Account.Input.Elements.ToHashSet(StringComparer.Ordinal);
        if (streams.Supply != 0)
        {
            symbols.Add("O");
        }

        foreach (var symbol in symbols.Order(StringComparer.Ordinal))
        {
            var supply = symbol == "O" ? streams.Supply : 0;
            var input = assembly.Account.Input[symbol] + supply;
            var shares = new[]
            {
                streams.Metal[symbol], streams.Slag[symbol], streams.Gas[symbol], streams.Dust[symbol], streams.Carbon[symbol],
                streams.Unplaced[symbol],
            };
            var output = shares.Sum();
            if (input == 0 && output == 0)
            {
                continue;
            }

            // Where nearly all oxygen is removed, what is left is a small difference: the error is relative to what was moved.
            // Sulfide takes the place of oxide ions, so the oxygen of a slag with sulfur is a difference of amounts of the slag's size.
            var exchanged = symbol == "O" && streams.EquilibriumSlag["S"] > 0 ? state.Amount(PhaseKind.Slag) : 0;
            largestError = Math.Max(
                largestError, Math.Abs(output - input) / Math.Max(Math.Max(input, output), Math.Abs(supply) + exchanged));
            input = supply == 0 ? input : output;
            if (!(output > 0))
            {
                continue;
            }

            var inMetal = streams.EquilibriumMetal[symbol];
            var inSlag = streams.EquilibriumSlag[symbol];
            rows.Add(new ElementDistribution
            {
                Element = symbol,
                InputKg = input * catalogue.Elements[symbol].AtomicMassGramPerMol / 1000,
                MetalFraction = shares[0] / output,
                SlagFraction = shares[1] / output,
                GasFraction = shares[2] / output,
                MechanicalDustFraction = shares[3] / output,
                UnburntCarbonFraction = shares[4] / output,
                UnplacedFraction = shares[5] / output,
                MetalMassPpm = metalMass > 0 ? 1e6 * streams.MassKg(streams.Metal, symbol) / metalMass : null,
                SlagMassPpm = slagMass > 0 ? 1e6 * streams.MassKg(streams.Slag, symbol) / slagMass : null,
                PartitionRatioSlagToMetal = inMetal > 0 && inSlag > 0
                    ? inSlag / equilibriumSlagMass / (inMetal / equilibriumMetalMass)
                    : null,
                Activity = state.LnActivity(symbol) is { } lnActivity ? Math.Exp(lnActivity) : null,
                ActivityReference = StateConversion.ReferenceName(symbol),
            });
        }

        return [.. rows.OrderByDescending(row => row.InputKg).ThenBy(row => row.Element, StringComparer.Ordinal)];
    }

    private SolventLoss Loss()
    {
        var solvent = assembly.Solvent;
        var input = streams.MassKg(assembly.Account.Input, solvent);
        var bypass = assembly.Account.Bypass;
        var inMetal = streams.MassKg(streams.EquilibriumMetal, solvent) + streams.MassKg(bypass[ChargeOrigin.Metal], solvent);
        var entrained = inMetal * streams.MetalShareInSlag;
        var inSlag = streams.MassKg(streams.EquilibriumSlag, solvent)
            + (assembly.Family is null ? 0 : streams.MassKg(bypass[ChargeOrigin.Slag], solvent));
        var dissolved = inSlag * (1 - streams.SlagShareInMetal);
        var gas = streams.MassKg(streams.Gas, solvent);
        var dust = streams.MassKg(streams.Dust, solvent);
        return new SolventLoss(
            input, dissolved, entrained, gas, dust, input > 0 ? Math.Min(1, (dissolved + entrained + gas + dust) / input) : 0);
    }

    private AllowancesReport? Allowances()
    {
        var allowances = vesselCase.Allowances;
        var efficiencies = allowances.StageEfficiencies
            .Where(e => e.Efficiency < 1)
            .Select(e => new AppliedStageEfficiency(
                e.Element, e.Efficiency, assembly.Account.Bypass.Values.Sum(ledger => streams.MassKg(ledger, e.Element))))
            .ToArray();
        var on = streams.MetalInSlagMassPercent > 0 || allowances.SlagInMetalMassPercent > 0
            || allowances.MechanicalDustMassFraction > 0 || efficiencies.Length > 0;
        return on
            ? new AllowancesReport(
                streams.MetalInSlagMassPercent,
                streams.MetalInSlagKg,
                allowances.MetalInSlagTypical ? assembly.Family?.EntrainmentSlot ?? "" : "",
                allowances.SlagInMetalMassPercent,
                streams.SlagInMetalKg,
                allowances.MechanicalDustMassFraction,
                efficiencies)
            : null;
    }

    /// <summary>Data of species that can matter: gas species below 1e-12 of the total pressure are left out.</summary>
    private List<DatumUse> UsedData()
    {
        var idle = new HashSet<string>(StringComparer.Ordinal);
        foreach (var s in state.SpeciesOf(PhaseKind.Gas))
        {
            if (state.MoleFraction[s] < GasReporter.SmallestVolumeFraction)
            {
                idle.UnionWith(state.Assembled.Species[s].Slots);
            }
        }

        return [.. assembly.Ledger.Uses.Where(use => !idle.Contains(use.Key) || use.Value[0].Overridden)
            .OrderBy(use => use.Key, StringComparer.Ordinal).SelectMany(use => use.Value)];
    }
}

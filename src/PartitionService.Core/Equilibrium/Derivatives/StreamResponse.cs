using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Equilibrium.Charging;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>Response of what leaves the vessel: bypass, inert slag, dust and entrainment on top of the equilibrium.</summary>
/// <remarks>The chain rule on the streams of the answer; where entrainment is limited, the limit's own derivative.</remarks>
internal sealed class StreamResponse
{
    private readonly VesselAssembly assembly;
    private readonly string[] symbols;
    private readonly int[] component;
    private readonly double[] kilogram;
    private readonly int phases;
    private readonly int metalPhase;
    private readonly int slagPhase;
    private readonly int gasPhase;
    private readonly int carbonPhase;
    private readonly double metalShare;
    private readonly double slagShare;
    private readonly Streams value;
    private readonly Streams change;
    private readonly LinearMass toSlag;
    private readonly LinearMass toMetal;

    /// <summary>Adds up the streams of a solution.</summary>
    /// <param name="assembly">The case.</param>
    /// <param name="held">Amount of each component in each phase, mol, [component][phase].</param>
    /// <param name="symbols">Elements of the answer.</param>
    /// <param name="allowances">Allowances of the case.</param>
    /// <param name="elements">Atomic masses.</param>
    public StreamResponse(
        VesselAssembly assembly,
        double[] held,
        string[] symbols,
        PracticeAllowances allowances,
        IReadOnlyDictionary<string, Element> elements)
    {
        this.assembly = assembly;
        this.symbols = symbols;
        var assembled = assembly.Assembled;
        phases = assembled.Phases.Length;
        metalPhase = Array.IndexOf(assembled.Phases, PhaseKind.Metal);
        slagPhase = Array.IndexOf(assembled.Phases, PhaseKind.Slag);
        gasPhase = Array.IndexOf(assembled.Phases, PhaseKind.Gas);
        carbonPhase = Array.IndexOf(assembled.Phases, PhaseKind.Carbon);
        component = [.. symbols.Select(symbol => Component(assembled, symbol))];
        kilogram = [.. symbols.Select(symbol => elements[symbol].AtomicMassGramPerMol / 1000)];
        value = new Streams(symbols.Length);
        change = new Streams(symbols.Length);
        Fill(value, held, assembly.Account);
        var metalMass = Mass(value.Metal);
        var slagMass = Mass(value.Slag);
        (toSlag, toMetal) = LinearMass.Entrainment(metalMass, slagMass, allowances, assembly.Family);
        metalShare = metalMass > 0 ? toSlag.Of(metalMass, slagMass) / metalMass : 0;
        slagShare = slagMass > 0 ? toMetal.Of(metalMass, slagMass) / slagMass : 0;
    }

    /// <summary>Writes the derivatives of metal, slag and gas fraction of every element, element by element.</summary>
    /// <param name="holding">Response of what each phase holds, mol.</param>
    /// <param name="account">Change of the charge; null where it stays.</param>
    /// <param name="target">Receives three numbers per element.</param>
    public void Write(double[] holding, ChargeAccount? account, Span<double> target)
    {
        Fill(change, holding, account);
        var metalMass = Mass(value.Metal);
        var slagMass = Mass(value.Slag);
        var metalChange = Mass(change.Metal);
        var slagChange = Mass(change.Slag);
        var metalShareChange = metalMass > 0 ? (toSlag.Of(metalChange, slagChange) - (metalShare * metalChange)) / metalMass : 0;
        var slagShareChange = slagMass > 0 ? (toMetal.Of(metalChange, slagChange) - (slagShare * slagChange)) / slagMass : 0;
        for (var e = 0; e < symbols.Length; e++)
        {
            var (metal, slag) = (value.Metal[e], value.Slag[e]);
            var total = metal + slag + value.Gas[e] + value.Other[e];
            var carried = (metalShare * metal) - (slagShare * slag);
            var carriedChange = (metalShare * change.Metal[e]) + (metalShareChange * metal)
                - (slagShare * change.Slag[e]) - (slagShareChange * slag);
            var totalChange = change.Metal[e] + change.Slag[e] + change.Gas[e] + change.Other[e];
            target[3 * e] = ((change.Metal[e] - carriedChange) - ((metal - carried) / total * totalChange)) / total;
            target[(3 * e) + 1] = ((change.Slag[e] + carriedChange) - ((slag + carried) / total * totalChange)) / total;
            target[(3 * e) + 2] = (change.Gas[e] - (value.Gas[e] / total * totalChange)) / total;
        }
    }

    private static int Component(AssembledCase assembled, string symbol)
    {
        var carried = Array.IndexOf(assembled.Carried, symbol);
        var link = Array.IndexOf(assembled.Links, symbol);
        return carried >= 0 ? carried : link >= 0 ? assembled.Carried.Length + link : -1;
    }

    private void Fill(Streams streams, double[] held, ChargeAccount? account)
    {
        for (var e = 0; e < symbols.Length; e++)
        {
            streams.Metal[e] = Held(held, e, metalPhase);
            streams.Slag[e] = Held(held, e, slagPhase);
            streams.Gas[e] = Held(held, e, gasPhase);
            streams.Other[e] = Held(held, e, carbonPhase);
            if (account is null)
            {
                continue;
            }

            var symbol = symbols[e];
            var slag = account.Bypass[ChargeOrigin.Slag][symbol];
            streams.Metal[e] += account.Bypass[ChargeOrigin.Metal][symbol];
            streams.Slag[e] += account.Inert[symbol] + (assembly.Family is null ? 0 : slag);
            streams.Other[e] += account.Dust[symbol] + account.Bypass[ChargeOrigin.Carbon][symbol]
                + account.Bypass[ChargeOrigin.Gas][symbol] + (assembly.Family is null ? slag : 0)
                + (component[e] < 0 ? account.Reacting[symbol] : 0);
        }
    }

    private double Held(double[] held, int e, int phase) =>
        phase < 0 || component[e] < 0 ? 0 : held[(component[e] * phases) + phase];

    private double Mass(double[] amounts)
    {
        var sum = 0.0;
        for (var e = 0; e < amounts.Length; e++)
        {
            sum += amounts[e] * kilogram[e];
        }

        return sum;
    }

    /// <summary>Amounts before entrainment, mol.</summary>
    private sealed class Streams(int count)
    {
        /// <summary>Metal with what bypasses with it.</summary>
        public double[] Metal { get; } = new double[count];

        /// <summary>Slag with its inert part and what bypasses with it.</summary>
        public double[] Slag { get; } = new double[count];

        /// <summary>Gas.</summary>
        public double[] Gas { get; } = new double[count];

        /// <summary>Dust, unburnt carbon and what cannot be placed.</summary>
        public double[] Other { get; } = new double[count];
    }
}

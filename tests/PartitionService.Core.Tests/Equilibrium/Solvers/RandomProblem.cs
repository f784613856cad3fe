using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Tests.Equilibrium.Solvers;

/// <summary>Random equilibrium problems that span many decades in amounts and constants.</summary>
internal static class RandomProblem
{
    /// <summary>Metal, slag and gas; oxygen and sulfur linked; some polyatomic vapours and two valences.</summary>
    public static EquilibriumProblem Create(Random random, bool fixedOxygen, bool gas)
    {
        var elements = random.Next(2, 31);
        var phases = gas ? 3 : 2;
        var groups = new List<int> { 0 };
        var lnK = new List<double>();
        var phase = new List<int>();
        var multiplicity = new List<int>();
        var oxygen = new List<double>();
        var sulfur = new List<double>();
        var amounts = new double[elements];
        double Between(double low, double high) => low + (random.NextDouble() * (high - low));
        void Add(double k, int p, int m, double o, double s)
        {
            lnK.Add(k);
            phase.Add(p);
            multiplicity.Add(m);
            oxygen.Add(o);
            sulfur.Add(s);
        }

        double oxygenHeld = 0;
        for (var element = 0; element < elements; element++)
        {
            var solvent = element == 0;
            amounts[element] = solvent ? 1e4 : Math.Pow(10, Between(-6, 3));
            Add(solvent ? 0 : Between(-8, 8), 0, 1, 0, 0);
            var nu = 0.5 * random.Next(1, 6);
            var strength = Between(-5, 40);
            Add(strength, 1, 1, nu, 0);
            if (random.Next(3) == 0)
            {
                Add(strength + Between(-3, 12), 1, 1, nu + 0.5, 0);
            }

            if (gas)
            {
                Add(Between(-25, solvent ? -10 : 2), 2, 1, 0, 0);
                if (random.Next(3) == 0)
                {
                    Add(Between(-20, 10), 2, 1, 1, 0);
                    Add(Between(-20, 10), 2, 1, 0, 1);
                }

                if (random.Next(4) == 0)
                {
                    Add(Between(-30, 10), 2, random.Next(2, 5), 0, 0);
                }
            }

            oxygenHeld += amounts[element] * nu * (solvent ? 0.01 : random.NextDouble());
            groups.Add(lnK.Count);
        }

        var inert = Between(10, 1e3);
        amounts = [.. amounts, inert];
        Add(0, 1, 1, 0, 0);
        groups.Add(lnK.Count);
        if (gas)
        {
            amounts = [.. amounts, Between(1, 1e4)];
            Add(0, 2, 1, 0, 0);
            groups.Add(lnK.Count);
        }

        Add(Between(-3, 6), 0, 0, 1, 0);
        Add(Between(-3, 6), 0, 0, 0, 1);
        if (gas)
        {
            Add(0, 2, 0, 2, 0);
            Add(0, 2, 0, 0, 2);
            Add(Between(20, 40), 2, 0, 2, 1);
        }

        groups.Add(lnK.Count);
        var padded = (lnK.Count + 7) / 8 * 8;
        double[] Pad(List<double> values, double fill) => [.. values, .. Enumerable.Repeat(fill, padded - values.Count)];
        return new EquilibriumProblem
        {
            ElementCount = amounts.Length,
            LinkCount = 2,
            PhaseCount = phases,
            GroupStart = [.. groups],
            LnK = Pad(lnK, EquilibriumProblem.LnZero),
            Phase = [.. phase, .. Enumerable.Repeat(0, padded - phase.Count)],
            Multiplicity = [.. multiplicity, .. Enumerable.Repeat(0, padded - multiplicity.Count)],
            LinkAtoms = [Pad(oxygen, 0), Pad(sulfur, 0)],
            ElementAmount = amounts,
            LinkAmount = [oxygenHeld, Math.Pow(10, Between(-4, 2))],
            LinkFixed = [fixedOxygen, false],
            LinkPotential = [Between(-20, -5), 0],
            SlagPhase = 1,
            CarbonPhase = -1,
            CarbonIsGasified = false,
            LinkHasLadder = [true, false],
            PhaseGuess = gas ? [1e4, inert, 100] : [1e4, inert],
        };
    }
}

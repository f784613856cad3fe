namespace PartitionService.IndependentSolution.Minimising;

/// <summary>Point of the minimisation: logarithms of amounts, multipliers of the elements.</summary>
internal sealed class GibbsState
{
    /// <summary>Starts where no element is used up: each species holds a share of its scarcest element.</summary>
    public GibbsState(GibbsProblem problem)
    {
        var count = problem.Species.Length;
        LnAmount = new double[count];
        Potential = new double[problem.Elements.Length];
        var uses = problem.Atoms.Select(row => row.Count(a => a > 0)).ToArray();
        for (var s = 0; s < count; s++)
        {
            var share = problem.Amount.Max();
            for (var e = 0; e < uses.Length; e++)
            {
                if (problem.Atoms[e][s] > 0 && problem.Amount[e] > 0)
                {
                    share = Math.Min(share, problem.Amount[e] / problem.Atoms[e][s] / uses[e]);
                }
            }

            LnAmount[s] = Math.Log(share);
        }

        foreach (var phase in Enum.GetValues<Physics.Phase>())
        {
            Active[(int)phase] = problem.Species.Any(s => s.Phase == phase);
            LnTotal[(int)phase] = Math.Log(Enumerable.Range(0, count)
                .Where(s => problem.Species[s].Phase == phase).Sum(s => Math.Exp(LnAmount[s])));
        }
    }

    public double[] LnAmount { get; }

    public double[] Potential { get; set; }

    public double[] LnTotal { get; } = new double[4];

    public bool[] Active { get; } = new bool[4];

    public bool IsActive(GibbsProblem problem, int s) => Active[(int)problem.Species[s].Phase];

    /// <summary>Amount of a species in mol.</summary>
    public double Amount(GibbsProblem problem, int s) => IsActive(problem, s) ? Math.Exp(LnAmount[s]) : 0;
}

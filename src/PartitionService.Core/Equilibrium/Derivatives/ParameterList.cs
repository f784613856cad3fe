using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>The parameters of a case, each with what one unit of it changes directly.</summary>
/// <param name="vesselCase">The case.</param>
/// <param name="assembly">The assembled case.</param>
/// <param name="feedback">Constants that depend on composition.</param>
/// <param name="elements">Atomic masses.</param>
internal sealed class ParameterList(
    VesselCase vesselCase,
    VesselAssembly assembly,
    CompositionFeedback feedback,
    IReadOnlyDictionary<string, Element> elements)
{
    private readonly AssembledCase assembled = assembly.Assembled;

    /// <summary>One parameter.</summary>
    /// <param name="Kind">Which.</param>
    /// <param name="Name">Formula or slot; may be empty.</param>
    /// <param name="Index">Position in the charge, or -1.</param>
    /// <param name="Unit">Unit.</param>
    /// <param name="Value">Value.</param>
    /// <param name="Perturb">Adds the direct changes per unit; null where there is no derivative.</param>
    /// <param name="Account">Change of the charge per unit; null where it stays.</param>
    internal sealed record Parameter(
        DerivativeParameterKind Kind,
        string Name,
        int Index,
        string Unit,
        double Value,
        Action<Perturbation>? Perturb,
        ChargeAccount? Account = null);

    /// <summary>The parameters of the selected groups.</summary>
    /// <param name="selection">Groups.</param>
    /// <param name="data">Data that entered.</param>
    public IEnumerable<Parameter> Select(DerivativeSelection selection, IReadOnlyList<DatumUse> data)
    {
        if (selection.Temperature)
        {
            yield return new Parameter(
                DerivativeParameterKind.Temperature, "", -1, "K", vesselCase.TemperatureKelvin, AddTemperature);
        }

        if (selection.Pressure)
        {
            yield return new Parameter(DerivativeParameterKind.Pressure, "", -1, "atm", vesselCase.PressureAtm, AddPressure);
        }

        if (selection.Oxygen)
        {
            yield return Oxygen();
        }

        for (var index = 0; selection.Inputs && index < vesselCase.Charge.Count; index++)
        {
            var item = vesselCase.Charge[index];
            var unit = item.Unit == ChargeUnit.Kilogram ? "kg" : "Nm3";
            yield return Charged(DerivativeParameterKind.ChargeQuantity, item.Formula, index, unit, item.Quantity, item with { Quantity = 1 });
        }

        if (selection.Data)
        {
            foreach (var parameter in Data(data))
            {
                yield return parameter;
            }
        }
    }

    private void AddTemperature(Perturbation change)
    {
        for (var s = 0; s < assembled.Species.Length; s++)
        {
            change.AddLnK(s, assembled.Species[s].LnKPerKelvin);
        }

        feedback.AddTemperature(change);
        AddPotential(change, assembly.Potential?.PerKelvin ?? 0);
    }

    private void AddPressure(Perturbation change)
    {
        for (var s = 0; s < assembled.Species.Length; s++)
        {
            if (assembled.Species[s].Phase == PhaseKind.Gas)
            {
                change.AddLnK(s, -1 / vesselCase.PressureAtm);
            }
        }
    }

    private void AddPotential(Perturbation change, double halfLnPressure)
    {
        if (assembly.FixedOxygen is not null && assembled.OxygenLink >= 0)
        {
            change.Link[assembled.OxygenLink] += halfLnPressure;
        }
    }

    private Parameter Oxygen()
    {
        switch (vesselCase.Oxygen)
        {
            case OxygenStatement.Dissolved dissolved:
                return new Parameter(
                    DerivativeParameterKind.DissolvedOxygen, "", -1, "mass ppm", dissolved.MassPpm, feedback.AddDissolvedOxygen);
            case OxygenStatement.Closed:
                var input = assembly.Account.Input["O"] * elements["O"].AtomicMassGramPerMol / 1000;
                return Charged(DerivativeParameterKind.OxygenInput, "O2", -1, "kg", input, new ChargeItem("O2", 1));
            default:
                return new Parameter(
                    DerivativeParameterKind.Log10OxygenPressure,
                    "",
                    -1,
                    "1",
                    OxygenPotential.ToLog10(assembly.FixedOxygen!.Value),
                    change => AddPotential(change, OxygenPotential.FromLog10(1)));
        }
    }

    private Parameter Charged(DerivativeParameterKind kind, string name, int index, string unit, double value, ChargeItem one)
    {
        var account = assembly.Split(one);
        var known = account.Reacting.Elements.All(
            e => assembly.Account.Reacting[e] > 0 || (e == "O" && assembly.FixedOxygen is not null))
            && account.Input.Elements.All(e => assembly.Account.Input[e] > 0 || (e == "O" && assembly.FixedOxygen is not null))
            && (account.InertCations == 0 || assembly.Account.InertCations > 0);
        return new Parameter(kind, name, index, unit, value, known ? change => AddAmounts(account, change) : null, account);
    }

    private void AddAmounts(ChargeAccount account, Perturbation change)
    {
        change.HasAmounts = true;
        for (var i = 0; i < assembled.Carried.Length; i++)
        {
            change.ElementAmount[i] += assembled.Carried[i] == AssembledCase.InertName
                ? account.InertCations
                : account.Reacting[assembled.Carried[i]];
        }

        for (var j = 0; j < assembled.Links.Length; j++)
        {
            change.Link[j] += assembled.Problem.LinkFixed[j] ? 0 : account.Reacting[assembled.Links[j]];
        }

        feedback.AddInert(account.Inert, change);
    }

    private IEnumerable<Parameter> Data(IReadOnlyList<DatumUse> data)
    {
        var bySlot = new Dictionary<string, List<int>>(StringComparer.Ordinal);
        for (var s = 0; s < assembled.Species.Length; s++)
        {
            foreach (var slot in assembled.Species[s].Slots)
            {
                if (!bySlot.TryGetValue(slot, out var users))
                {
                    bySlot[slot] = users = [];
                }

                users.Add(s);
            }
        }

        string? last = null;
        foreach (var use in data)
        {
            var slot = use.Key.Split('#')[0];
            if (slot != last)
            {
                var users = bySlot.GetValueOrDefault(slot, []);
                yield return new Parameter(
                    DerivativeParameterKind.Datum, slot, -1, use.Unit, use.Value, change => AddDatum(slot, users, change));
            }

            last = slot;
        }
    }

    private void AddDatum(string slot, List<int> users, Perturbation change)
    {
        foreach (var s in users)
        {
            change.AddLnK(s, LnKPerUnit(slot, s));
        }

        foreach (var (name, perUnit) in assembly.Potential?.PerDatum ?? [])
        {
            AddPotential(change, name == slot ? perUnit : 0);
        }

        feedback.AddInteraction(slot, change);
    }

    /// <summary>Change of ln K with the value of a datum: ln gamma, Gibbs energy in J/mol, log10 of a capacity.</summary>
    private double LnKPerUnit(string slot, int species) => slot.AsSpan(0, slot.IndexOf('/')) switch
    {
        "metal" => -1,
        "slag" => assembled.Species[species].HasProductDatum ? 1 : -1,
        "capacity" => Math.Log(10) * feedback.PerFormula(species),
        _ => -1 / (PhysicalConstants.GasConstant * vesselCase.TemperatureKelvin),
    };
}

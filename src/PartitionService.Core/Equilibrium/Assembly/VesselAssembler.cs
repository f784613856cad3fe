using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Charging;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Builds a <see cref="VesselAssembly"/>.</summary>
/// <param name="vesselCase">A valid case.</param>
/// <param name="catalogue">The catalogue.</param>
/// <param name="withoutMetal">True to leave the metal out: more oxygen was charged than a metal can live with.</param>
internal sealed class VesselAssembler(VesselCase vesselCase, ThermochemicalCatalogue catalogue, bool withoutMetal = false)
{
    private readonly double temperature = vesselCase.TemperatureKelvin;
    private readonly DatumLedger ledger = new(catalogue, vesselCase.Overrides, vesselCase.TemperatureKelvin);

    /// <summary>Assembles the case.</summary>
    /// <param name="failure">Why it cannot be assembled; null on success.</param>
    public VesselAssembly? Assemble(out SolveOutcome.Failed? failure)
    {
        var family = vesselCase.SlagFamily is { } name ? catalogue.SlagFamilies[name] : null;
        var index = SlagIndex.For(catalogue);
        var hasSlagSpecies = new Dictionary<string, bool>(StringComparer.Ordinal);
        ChargeAccount Split(IEnumerable<ChargeItem> items) => ChargeAccount.Split(
            items.Select(item => ChargeReader.Read(item, catalogue.Elements)),
            vesselCase.Allowances,
            family is not null,
            HasSlagSpecies,
            index.UsualOxygen);
        bool HasSlagSpecies(string element)
        {
            if (!hasSlagSpecies.TryGetValue(element, out var has))
            {
                hasSlagSpecies[element] = has = family is not null && index.Oxides(family.Name, element, ledger).Any();
            }

            return has;
        }

        var account = Split(vesselCase.Charge);
        var solvent = SolventSelection.Choose(vesselCase.Solvent, account, catalogue, out failure);
        if (solvent is null)
        {
            return null;
        }

        FixedPotential? potential = null;
        double? fixedOxygen = null;
        if (vesselCase.Oxygen is not (OxygenStatement.Closed or OxygenStatement.Dissolved))
        {
            potential = OxygenStatementReader.Potential(vesselCase.Oxygen, temperature, catalogue, ledger);
            fixedOxygen = potential?.HalfLnPressure;
        }
        else if (vesselCase.Oxygen is OxygenStatement.Dissolved)
        {
            fixedOxygen = DissolvedStart(solvent);
            if (fixedOxygen is null)
            {
                failure = new SolveOutcome.Failed(
                    SolveFailure.DissolvedOxygenNotReachable,
                    $"The catalogue has no datum for oxygen dissolved in {solvent}; state the oxygen in another way.",
                    ["O", solvent]);
                return null;
            }
        }

        var present = Present(account, fixedOxygen is not null);
        if (!vesselCase.GasAllowed)
        {
            // Blown gas that meets no gas phase has no place; dissolving all of it would be absurd.
            present.RemoveWhere(e => e is "N" or "H" or "Ar" && account.GasCharge[e] > 0);
        }

        var species = new List<SpeciesRecord>();
        foreach (var element in present.Where(e => e is not ("Ar" or "F" or "I")).Order(StringComparer.Ordinal))
        {
            if (MetalSpecies.Create(catalogue.Elements[element], solvent, temperature, catalogue, ledger) is { } dissolved)
            {
                species.Add(dissolved);
            }
        }

        var slag = family is null ? null : new SlagSpecies(family, solvent, temperature, catalogue, ledger);
        if (slag is not null)
        {
            species.AddRange(present.Order(StringComparer.Ordinal).SelectMany(e => slag.Create(catalogue.Elements[e])));
            if (present.Contains("S") && present.Contains("O") && slag.Sulfide() is { } sulfide)
            {
                species.Add(sulfide);
            }
        }

        if (vesselCase.GasAllowed)
        {
            species.AddRange(GasSpecies.Create(present, temperature, vesselCase.PressureAtm, catalogue, ledger));
        }

        if (present.Contains("C"))
        {
            species.Add(new SpeciesRecord(
                "C", PhaseKind.Carbon, "C", new Dictionary<string, double>(StringComparer.Ordinal) { ["C"] = 1 }, 0, 0, "graphite", []));
        }

        var metalExcluded = ExcludeMetal(species, fixedOxygen, family is not null, out failure);
        if (withoutMetal)
        {
            species.RemoveAll(s => s.Phase == PhaseKind.Metal);
            metalExcluded = true;
        }

        return failure is not null
            ? null
            : Build(account, species, solvent, family, slag?.Terms, fixedOxygen, potential, metalExcluded, present, Split);
    }

    private VesselAssembly Build(
        ChargeAccount account,
        List<SpeciesRecord> species,
        string solvent,
        SlagFamily? family,
        SlagTerms? terms,
        double? fixedOxygen,
        FixedPotential? potential,
        bool metalExcluded,
        HashSet<string> present,
        Func<IEnumerable<ChargeItem>, ChargeAccount> split)
    {
        var phases = new List<PhaseKind>();
        if (!metalExcluded)
        {
            phases.Add(PhaseKind.Metal);
        }

        if (family is not null)
        {
            phases.Add(PhaseKind.Slag);
        }

        if (vesselCase.GasAllowed)
        {
            phases.Add(PhaseKind.Gas);
        }

        if (present.Contains("C"))
        {
            phases.Add(PhaseKind.Carbon);
        }

        var amounts = present.Where(e => account.Reacting[e] > 0)
            .ToDictionary(e => e, e => account.Reacting[e], StringComparer.Ordinal);
        var builder = new ProblemBuilder(amounts, account.InertCations, fixedOxygen);
        var assembled = builder.Build(
            species, [.. phases], solvent, [.. phases.Select(phase => PhaseGuess.Of(phase, account))],
            InteractionIndex.Pairs(catalogue, solvent, vesselCase.Overrides), Epsilon);
        return new VesselAssembly
        {
            Account = account,
            Assembled = assembled,
            Ledger = ledger,
            Solvent = solvent,
            Family = family,
            Terms = terms,
            FixedOxygen = fixedOxygen,
            Potential = potential,
            Split = item => split([item]),
            MetalExcluded = metalExcluded,
        };

        InteractionTerm Epsilon(InteractionIndex.Pair pair)
        {
            var row = ledger.Select<InteractionDatum>(pair.Slot);
            var given = ledger.Override(pair.Slot);
            var value = given ?? row!.Epsilon(temperature);
            ledger.Take(
                pair.Slot, row, $"epsilon of {pair.First} and {pair.Second} in liquid {solvent}", value, "1", row?.SigmaEpsilon);
            return new InteractionTerm(pair.Slot, value, given is null ? row!.EpsilonPerKelvin(temperature) : 0);
        }
    }

    private static HashSet<string> Present(ChargeAccount account, bool oxygenFixed)
    {
        var present = account.Reacting.Elements.Where(e => account.Reacting[e] > 0).ToHashSet(StringComparer.Ordinal);
        if (oxygenFixed)
        {
            present.Add("O");
        }

        return present;
    }

    /// <summary>Potential of dissolved oxygen at infinite dilution, the start of the passes.</summary>
    private double? DissolvedStart(string solvent)
    {
        if (vesselCase.Oxygen is not OxygenStatement.Dissolved statement
            || MetalSpecies.Create(catalogue.Elements["O"], solvent, temperature, catalogue, ledger) is not { LnGamma: { } lnGamma })
        {
            return null;
        }

        var fraction = 1e-6 * statement.MassPpm
            * catalogue.Elements[solvent].AtomicMassGramPerMol / catalogue.Elements["O"].AtomicMassGramPerMol;
        return Math.Log(Math.Min(fraction, 0.5)) + lnGamma;
    }

    /// <summary>A fixed oxygen potential at which dissolved oxygen alone would fill the metal leaves no metal.</summary>
    private bool ExcludeMetal(List<SpeciesRecord> species, double? fixedOxygen, bool slagAllowed, out SolveOutcome.Failed? failure)
    {
        failure = null;
        var dissolved = species.Find(s => s is { Phase: PhaseKind.Metal, Name: "O" });
        if (dissolved is not null && fixedOxygen is { } potential && vesselCase.Oxygen is not OxygenStatement.Dissolved
            && dissolved.LnK + potential >= 0)
        {
            if (!slagAllowed)
            {
                failure = new SolveOutcome.Failed(
                    SolveFailure.OxygenHasNoHome,
                    FormattableString.Invariant(
                        $"At log10 pO2 = {OxygenPotential.ToLog10(potential):0.##} the metal alone would take up oxygen without limit. State a lower oxygen potential or allow a slag."),
                    ["O"]);
                return false;
            }

            species.RemoveAll(s => s.Phase == PhaseKind.Metal);
            return true;
        }

        var gas = species.Find(s => s is { Phase: PhaseKind.Gas, Name: "O2" });
        if (gas is not null && fixedOxygen is { } stated && gas.LnK + (2 * stated) >= 0)
        {
            failure = new SolveOutcome.Failed(
                SolveFailure.PressureExceeded,
                FormattableString.Invariant(
                    $"The stated oxygen potential, log10 pO2 = {OxygenPotential.ToLog10(stated):0.##}, reaches the total pressure of {vesselCase.PressureAtm:0.######} atm: it would take an unlimited amount of gas."),
                ["O"]);
        }

        return false;
    }
}

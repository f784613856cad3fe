using PartitionService.Core.Equilibrium.Charging;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>What of the charge takes part in the equilibrium, and what stays out of it and where.</summary>
/// <remarks>Every atom of the charge is in exactly one of the ledgers; <see cref="Input"/> is their sum.</remarks>
internal sealed class ChargeAccount
{
    private const double SmallestShare = 1e-16;

    private ChargeAccount()
    {
    }

    /// <summary>Everything that goes in, mol.</summary>
    public ElementLedger Input { get; } = new();

    /// <summary>What takes part in the equilibrium, mol.</summary>
    public ElementLedger Reacting { get; } = new();

    /// <summary>Mechanical dust, mol.</summary>
    public ElementLedger Dust { get; } = new();

    /// <summary>Inert part of the slag that has no activity coefficient, mol; dilutes the slag.</summary>
    public ElementLedger Inert { get; } = new();

    /// <summary>Mono-cations of the inert part, mol.</summary>
    public double InertCations { get; private set; }

    /// <summary>What bypasses the equilibrium, by the phase that it came with, mol.</summary>
    public Dictionary<ChargeOrigin, ElementLedger> Bypass { get; } = Enum.GetValues<ChargeOrigin>()
        .ToDictionary(origin => origin, _ => new ElementLedger());

    /// <summary>Metallic atoms charged in metallic form, mol.</summary>
    public ElementLedger Metallic { get; } = new();

    /// <summary>Elements charged as slag constituents, with their whole-oxide mass for the slag composition, mol of element.</summary>
    public ElementLedger SlagCharge { get; } = new();

    /// <summary>Oxygen that ferric iron of the slag charge carries beyond FeO, mol of ferric iron.</summary>
    public double FerricIron { get; private set; }

    /// <summary>Atoms charged as gas, mol.</summary>
    public ElementLedger GasCharge { get; } = new();

    /// <summary>Splits a charge.</summary>
    /// <param name="constituents">The charge.</param>
    /// <param name="allowances">Dust and stage efficiencies.</param>
    /// <param name="slagAllowed">True where a slag may form.</param>
    /// <param name="hasSlagSpecies">True for an element that the slag family has an oxide or chloride of.</param>
    /// <param name="usualOxygen">Oxygen atoms per atom in the usual oxide of an element; splits the oxygen of mixed oxides.</param>
    public static ChargeAccount Split(
        IEnumerable<ChargeConstituent> constituents,
        PracticeAllowances allowances,
        bool slagAllowed,
        Func<string, bool> hasSlagSpecies,
        Func<string, double> usualOxygen)
    {
        var account = new ChargeAccount();
        var efficiency = allowances.StageEfficiencies.ToDictionary(e => e.Element, e => e.Efficiency, StringComparer.Ordinal);

        // A canonical order makes sums, and so the answer, independent of the order of the charge.
        foreach (var constituent in constituents
            .OrderBy(c => c.Formula, StringComparer.Ordinal).ThenBy(c => c.MassKg))
        {
            account.Add(constituent, allowances.MechanicalDustMassFraction, efficiency, slagAllowed, hasSlagSpecies, usualOxygen);
        }

        return account;
    }

    private void Add(
        ChargeConstituent constituent,
        double dustFraction,
        Dictionary<string, double> efficiency,
        bool slagAllowed,
        Func<string, bool> hasSlagSpecies,
        Func<string, double> usualOxygen)
    {
        // Gases and organic matter mix fully: they make no dust and always take part.
        var gaseous = constituent.Origin == ChargeOrigin.Gas;
        var dust = gaseous ? 0 : dustFraction;
        var fluoride = constituent.CountPerFormula.Keys.Any(e => e is "F" or "I");
        var mains = constituent.CountPerFormula.Keys.Where(e => !LinkComponents.Contains(e) && e is not ("F" or "I")).ToArray();
        var weight = mains.ToDictionary(e => e, e => constituent.CountPerFormula[e] * usualOxygen(e), StringComparer.Ordinal);
        var weightSum = weight.Values.Sum();
        foreach (var (element, amount) in constituent.Atoms)
        {
            Input.Add(element, amount);
            Dust.Add(element, amount * dust);
            Note(constituent, element, amount * (1 - dust));
        }

        foreach (var main in mains)
        {
            var inert = slagAllowed && constituent.Origin == ChargeOrigin.Slag && main is not ("C" or "N" or "Ar")
                && (fluoride || !hasSlagSpecies(main));
            var share = inert ? 0 : gaseous ? 1 : efficiency.GetValueOrDefault(main, 1);
            var partner = weightSum > 0 ? weight[main] / weightSum : 1.0 / mains.Length;
            var outside = inert ? Inert : Bypass[constituent.Origin];
            Place(main, constituent.Atoms[main] * (1 - dust), share, outside);
            if (inert)
            {
                InertCations += constituent.Atoms[main] * (1 - dust);
            }

            foreach (var (element, amount) in constituent.Atoms)
            {
                if (LinkComponents.Contains(element) || element is "F" or "I")
                {
                    var linkShare = element == "S" && !inert && !gaseous ? efficiency.GetValueOrDefault("S", share) : share;
                    Place(element, amount * partner * (1 - dust), linkShare, outside);
                }
            }
        }

        if (mains.Length == 0)
        {
            foreach (var (element, amount) in constituent.Atoms)
            {
                Place(element, amount * (1 - dust), gaseous ? 1 : efficiency.GetValueOrDefault(element, 1), Bypass[constituent.Origin]);
            }
        }
    }

    private void Place(string element, double amount, double share, ElementLedger outside)
    {
        // Beside the whole a share below its rounding is none; the solver need not look for such traces.
        var reacting = share < SmallestShare ? 0 : share;
        Reacting.Add(element, amount * reacting);
        outside.Add(element, amount * (1 - reacting));
    }

    private void Note(ChargeConstituent constituent, string element, double amount)
    {
        switch (constituent.Origin)
        {
            case ChargeOrigin.Metal when !LinkComponents.Contains(element) && element is not ("C" or "N"):
                Metallic.Add(element, amount);
                break;
            case ChargeOrigin.Slag:
                SlagCharge.Add(element, amount);
                if (element == "Fe" && constituent.CountPerFormula.GetValueOrDefault("O") > 1.2 * constituent.CountPerFormula["Fe"]
                    && constituent.CountPerFormula.Count == 2)
                {
                    // Fe2O3 is all ferric; Fe3O4 holds 2/3 ferric.
                    var ratio = constituent.CountPerFormula["O"] / constituent.CountPerFormula["Fe"];
                    FerricIron += amount * Math.Clamp(2 * (ratio - 1), 0, 1);
                }

                break;
            case ChargeOrigin.Gas:
                GasCharge.Add(element, amount);
                break;
            default:
                break;
        }
    }
}

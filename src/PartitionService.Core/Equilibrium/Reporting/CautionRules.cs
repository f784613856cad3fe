using System.Globalization;

namespace PartitionService.Core.Equilibrium.Reporting;

/// <summary>Hazards of what leaves the vessel. They name the hazard and defer to local codes and licensed practice.</summary>
internal static class CautionRules
{
    /// <summary>Loads below this are not named, g per normal cubic metre.</summary>
    private const double SmallestLoad = 1e-6;

    private const string Defer = "follow local codes and licensed practice for exposure, filtration and emission";

    private static readonly (string Element, string Hazard)[] Elements =
    [
        ("As", "arsenic fume is toxic and carcinogenic"),
        ("Be", "beryllium fume is highly toxic and carcinogenic"),
        ("Cd", "cadmium fume is highly toxic and carcinogenic"),
        ("Cr", "chromium in fume and dust can be hexavalent, which is carcinogenic"),
        ("Hg", "mercury leaves as vapour that ordinary filters do not hold"),
        ("Ni", "nickel-bearing fume and dust are carcinogenic"),
        ("P", "phosphorus vapour is toxic and burns in air"),
        ("Pb", "lead fume is toxic"),
        ("Sb", "antimony fume is toxic"),
        ("Se", "selenium fume is toxic"),
        ("Te", "tellurium fume is toxic"),
        ("Tl", "thallium fume is highly toxic"),
        ("Zn", "zinc fume causes metal fume fever and burns where the gas meets air"),
    ];

    private static readonly (string Species, string Substance, string Hazard)[] Gases =
    [
        ("CO", "CO", "carbon monoxide is toxic and forms explosive mixtures with air"),
        ("SO2", "SO2", "sulfur dioxide is toxic and corrosive"),
        ("H2S", "H2S", "hydrogen sulfide is highly toxic"),
        ("HCl", "HCl", "hydrogen chloride is toxic and corrosive"),
        ("HBr", "HBr", "hydrogen bromide is toxic and corrosive"),
        ("Cl2", "Cl2", "chlorine is toxic"),
        ("H2", "H2", "hydrogen forms explosive mixtures with air"),
    ];

    /// <summary>All cautions, the general one last.</summary>
    public static IReadOnlyList<Caution> All(ReportContext context)
    {
        var cautions = new List<Caution>();
        if (context.Gas is { } gas)
        {
            foreach (var (element, hazard) in Elements)
            {
                var load = 1000 * context.Streams.MassKg(context.Streams.Gas, element) / gas.VolumeNormalCubicMetre;
                if (load >= SmallestLoad)
                {
                    cautions.Add(new Caution(element, Sentence(hazard, load), load));
                }
            }

            foreach (var (species, substance, hazard) in Gases)
            {
                var content = gas.Species.FirstOrDefault(s => s.Species == species);
                if (content is not null && content.VolumeFraction >= SmallestFraction(species))
                {
                    cautions.Add(new Caution(
                        substance, Sentence(hazard, content.LoadGramPerNormalCubicMetre), content.LoadGramPerNormalCubicMetre));
                }
            }

            var carbonHalogen = context.Streams.Gas["C"] > 0 && (context.Streams.Gas["Cl"] > 0 || context.Streams.Gas["Br"] > 0);
            if (carbonHalogen)
            {
                cautions.Add(new Caution(
                    "dioxins",
                    $"carbon with chlorine or bromine in a gas that cools slowly can form dioxins and furans, which this equilibrium does not show; {Defer}",
                    null));
            }
        }

        foreach (var (element, hazard) in Elements)
        {
            if (context.Streams.Dust[element] > 0 && !cautions.Exists(c => c.Substance == element))
            {
                cautions.Add(new Caution(element, $"{hazard}; it is in the mechanical dust; {Defer}", null));
            }
        }

        cautions.Add(new Caution(
            "molten metal and slag",
            "keep water, damp charge and closed cavities away from the melt; results are equilibrium estimates, not a permit to operate: local codes and licensed practice decide",
            null));
        return cautions;
    }

    private static double SmallestFraction(string species) => species switch
    {
        // Below these no one is endangered even undiluted; CO and H2 by the lower end of common exposure and ignition limits.
        "CO" => 1e-5,
        "H2" => 1e-2,
        _ => 1e-7,
    };

    private static string Sentence(string hazard, double load) =>
        string.Create(CultureInfo.InvariantCulture, $"{hazard}; {load:G3} g/Nm3 in the gas as it leaves the bath; {Defer}");
}

using Google.Protobuf;
using PartitionService.Cli.CaseFiles;
using PartitionService.Contracts.V1;

namespace PartitionService.HostileInput.Mutation;

/// <summary>Valid requests that the mutations start from: the vessels of the works and one request of every other kind.</summary>
public static class SeedMessages
{
    /// <summary>Folder of the case files that are shipped with the tool.</summary>
    public static string Examples => Path.Combine(AppContext.BaseDirectory, "Examples");

    /// <summary>Texts of the case files.</summary>
    public static IReadOnlyList<string> CaseFiles { get; } =
        [.. Directory.GetFiles(Examples, "*.yaml").Order(StringComparer.Ordinal).Select(File.ReadAllText)];

    /// <summary>The vessels of the case files.</summary>
    public static IReadOnlyList<VesselCase> Vessels { get; } = [.. CaseFiles.Select(text => CaseFileReader.Read("example", text).Case)];

    /// <summary>A request that needs an answer, of the kind that a method takes.</summary>
    public static IMessage For(string method, Dice dice) => method switch
    {
        "SolveCharge" => new SolveChargeRequest { VesselCase = dice.Of(Vessels).Clone() },
        "ListSolvents" => new ListSolventsRequest(),
        "ListSolutes" => new ListSolutesRequest { Solvent = "Cu", TemperatureKelvin = 1500, PageSize = 10 },
        "ListSlagFamilies" => new ListSlagFamiliesRequest { PageSize = 2 },
        "ListData" => new ListDataRequest { SlotPrefix = "metal/", Element = "Pb", IncludeCompeting = true, PageSize = 5 },
        "GetCoverage" => new GetCoverageRequest { Kind = CoverageKind.Slags },
        "ExplainDatum" => new ExplainDatumRequest { Slot = Vocabulary.Slot(dice), TemperatureKelvin = 1573 },
        "ConvertActivityCoefficient" => new ConvertActivityCoefficientRequest
        {
            Solvent = "Cu",
            Solute = "Pb",
            TemperatureKelvin = 1573,
            From = ReferenceState.Raoultian,
            To = ReferenceState.HenrianOneMassPercent,
            Activity = 0.1,
        },
        _ => throw new ArgumentOutOfRangeException(nameof(method), method, "no seed for this method yet"),
    };
}

using PartitionService.Contracts.V1;

namespace PartitionService.Cli.CaseFiles;

/// <summary>A case that was read, with the places of its fields.</summary>
/// <param name="Name">Name of the file as the user gave it.</param>
/// <param name="Case">The case.</param>
/// <param name="Places">Where each field of the request stands in the file.</param>
internal sealed record CaseFile(string Name, VesselCase Case, FieldPlaces Places);

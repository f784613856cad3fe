namespace PartitionService.Client.Errors;

/// <summary>One field that the service refuses.</summary>
/// <param name="Path">Path of the field in the request, for example <c>vessel_case.charge[3].mass_kg</c>; indices from 0.</param>
/// <param name="Description">What is wrong and what is allowed, with the value sent.</param>
public sealed record FieldViolation(string Path, string Description);

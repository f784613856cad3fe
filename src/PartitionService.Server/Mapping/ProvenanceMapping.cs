using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns what qualifies an answer (remarks, cautions, data used) into what is sent.</summary>
internal static class ProvenanceMapping
{
    /// <summary>Maps a remark.</summary>
    public static Wire.Remark ToWire(Remark remark)
    {
        var sent = new Wire.Remark
        {
            Code = EnumMapping.ToWire(remark.Code),
            Severity = EnumMapping.ToWire(remark.Severity),
            Element = remark.Element,
            Subject = remark.Subject,
            Text = remark.Text,
        };
        sent.Numbers.AddRange(remark.Numbers.Select(n => new Wire.RemarkNumber { Name = n.Name, Value = n.Value, Unit = n.Unit }));
        return sent;
    }

    /// <summary>Maps a caution.</summary>
    public static Wire.Caution ToWire(Caution caution)
    {
        var sent = new Wire.Caution { Substance = caution.Substance, Text = caution.Text };
        if (caution.LoadGramPerNormalCubicMetre is { } load)
            sent.LoadGramPerNormalCubicMetre = load;
        return sent;
    }

    /// <summary>Maps a datum that entered the answer.</summary>
    public static Wire.DatumUse ToWire(DatumUse use)
    {
        var sent = new Wire.DatumUse
        {
            Key = use.Key,
            Quantity = use.Quantity,
            Value = use.Value,
            Unit = use.Unit,
            Access = EnumMapping.ToWire(use.Access),
            Overridden = use.Overridden,
            ExtrapolatedKelvin = use.ExtrapolatedKelvin,
        };
        if (use.Sigma is { } sigma)
            sent.Sigma = sigma;
        sent.SourceIds.AddRange(use.SourceIds);
        sent.Flags.AddRange(use.Flags);
        return sent;
    }
}

using System.Collections;
using Google.Protobuf;
using Google.Protobuf.Reflection;
using PartitionService.Server.Mapping;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Mapping;

public sealed class AnswerMappingTests
{
    /// <summary>A field that the mapping forgets stays at its default and shows here, also one that is added to the contract later.</summary>
    [Fact]
    public void Every_field_of_a_full_answer_is_filled() => Assert.Empty(Unfilled(AnswerMapping.ToWire(CoreAnswers.Full()), "answer"));

    [Fact]
    public void Every_number_lands_in_the_field_of_its_name()
    {
        var core = Numbers(CoreAnswers.Full()).Order().ToList();
        var wire = Numbers(AnswerMapping.ToWire(CoreAnswers.Full())).Order().ToList();
        Assert.Equal(core, wire);

        var sent = AnswerMapping.ToWire(CoreAnswers.Full());
        var element = Assert.Single(sent.Elements);
        Assert.Equal((0.91, 0.04, 0.02), (element.MetalFraction, element.SlagFraction, element.GasFraction));
        Assert.Equal((0.015, 0.01, 0.005), (element.MechanicalDustFraction, element.UnburntCarbonFraction, element.UnplacedFraction));
        Assert.Equal((981000, 12000), (element.MetalMassPpm, element.SlagMassPpm));
        Assert.Equal((901, 402, 62.5), (sent.Metal.MassKg, sent.Slag.MassKg, sent.Gas.MassKg));
        Assert.Equal((-8.1, -5.5, -9.5), (sent.Redox.Log10Po2Atm, sent.Redox.Log10Ps2Atm, sent.Redox.Log10Pcl2Atm));
        Assert.Equal((11.5, 6.7), (sent.Redox.Co2ToCoRatio, sent.Redox.H2OToH2Ratio));
        Assert.Equal((4.5, 3.15), (sent.Redox.OxygenToSupplyKg, sent.Redox.OxygenToSupplyNormalCubicMetre));
        Assert.Equal((4.25, 3.75, 0.5, 0.75), (sent.SolventLoss.DissolvedInSlagKg, sent.SolventLoss.EntrainedInSlagKg, sent.SolventLoss.GasKg, sent.SolventLoss.MechanicalDustKg));
        Assert.Equal((1.1, 4.4, 0.6, 5.4, 0.007), (sent.Allowances.MetalInSlagMassPercent, sent.Allowances.MetalInSlagKg, sent.Allowances.SlagInMetalMassPercent, sent.Allowances.SlagInMetalKg, sent.Allowances.MechanicalDustMassFraction));
        Assert.Equal((37, 4), (sent.Solution.Iterations, sent.Solution.ActivityPasses));
    }

    [Fact]
    public void What_is_absent_stays_unset()
    {
        var full = CoreAnswers.Full();
        var sent = AnswerMapping.ToWire(full with
        {
            SlagFamily = null,
            Metal = null,
            Slag = null,
            Gas = null,
            Allowances = null,
            Derivatives = null,
            WeakestAccess = null,
            Redox = new Core.Equilibrium.RedoxReport { OxygenToSupplyKg = 0, OxygenToSupplyNormalCubicMetre = 0 },
            Elements = [full.Elements[0] with { MetalMassPpm = null, SlagMassPpm = null, PartitionRatioSlagToMetal = null, Activity = null }],
            Cautions = [full.Cautions[0] with { LoadGramPerNormalCubicMetre = null }],
            DataUsed = [full.DataUsed[0] with { Sigma = null, Access = null }],
        });
        Assert.Equal("", sent.SlagFamily);
        Assert.Null(sent.Metal);
        Assert.Null(sent.Slag);
        Assert.Null(sent.Gas);
        Assert.Null(sent.Allowances);
        Assert.Null(sent.Derivatives);
        Assert.Equal(Contracts.V1.Access.Unspecified, sent.WeakestAccess);
        Assert.Equal(Contracts.V1.Access.Unspecified, sent.DataUsed[0].Access);
        Assert.False(sent.DataUsed[0].HasSigma);
        Assert.False(sent.Cautions[0].HasLoadGramPerNormalCubicMetre);
        Assert.DoesNotContain(PresenceFields(sent.Redox), f => f.Accessor.HasValue(sent.Redox));
        Assert.DoesNotContain(PresenceFields(sent.Elements[0]), f => f.Accessor.HasValue(sent.Elements[0]));
    }

    private static IEnumerable<FieldDescriptor> PresenceFields(IMessage message) =>
        message.Descriptor.Fields.InDeclarationOrder().Where(f => f.HasPresence);

    private static IEnumerable<string> Unfilled(IMessage message, string path)
    {
        foreach (var field in message.Descriptor.Fields.InDeclarationOrder())
        {
            var here = $"{path}.{field.Name}";
            var value = field.Accessor.GetValue(message);
            if (value is IList { Count: 0 } or "" or null or 0 or 0.0 or false || (value is Enum && Convert.ToInt32(value, null) == 0))
                yield return here;
            var children = value is IList list ? list.OfType<IMessage>() : value is IMessage child ? [child] : [];
            foreach (var below in children.SelectMany(c => Unfilled(c, here)))
                yield return below;
        }
    }

    private static IEnumerable<double> Numbers(IMessage message) =>
        message.Descriptor.Fields.InDeclarationOrder().SelectMany(field => field.Accessor.GetValue(message) switch
        {
            double number => [number],
            IMessage child => Numbers(child),
            IList list => list.OfType<IMessage>().SelectMany(Numbers),
            _ => Enumerable.Empty<double>(),
        });

    private static IEnumerable<double> Numbers(object record) =>
        record.GetType().GetProperties().Where(p => p.GetIndexParameters().Length == 0).SelectMany(p => p.GetValue(record) switch
        {
            double number => [number],
            string => [],
            IList list => list.OfType<object>().Where(o => o is not string).SelectMany(Numbers),
            object child when child.GetType().IsClass => Numbers(child),
            _ => Enumerable.Empty<double>(),
        });
}

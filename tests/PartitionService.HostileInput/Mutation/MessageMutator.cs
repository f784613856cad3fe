using System.Collections;
using Google.Protobuf;
using Google.Protobuf.Reflection;

namespace PartitionService.HostileInput.Mutation;

/// <summary>Changes a message field by field, knowing the type and the name of each field.</summary>
public static class MessageMutator
{
    private const int DeepestPlace = 8;

    /// <summary>Changes one to five numbers and words of a message within what the contract allows, which gets furthest into the solver.</summary>
    public static void ChangeWithinLimits(IMessage message, Dice dice)
    {
        var places = new List<(IMessage Owner, FieldDescriptor Field)>();
        Collect(message, places, 0);
        places.RemoveAll(place => place.Field.IsRepeated || (place.Field.HasPresence && !place.Field.Accessor.HasValue(place.Owner)));
        for (var changes = 1 + dice.Throw(5); changes > 0; changes--)
        {
            var (owner, field) = dice.Of(places);
            if (field.FieldType == FieldType.Double)
                field.Accessor.SetValue(owner, HostileNumbers.Within(field.Name, dice));
            else if (field.FieldType == FieldType.String)
                field.Accessor.SetValue(owner, Vocabulary.Known(field.Name, dice));
            else if (field.FieldType == FieldType.Message && field.MessageType.Name == "OxygenStatement")
                field.Accessor.SetValue(owner, New(field, dice));
        }
    }

    /// <summary>Changes one to five places of a message.</summary>
    public static void Change(IMessage message, Dice dice)
    {
        for (var changes = 1 + dice.Throw(5); changes > 0; changes--)
        {
            var places = new List<(IMessage Owner, FieldDescriptor Field)>();
            Collect(message, places, 0);
            if (places.Count == 0)
                return;
            var (owner, field) = dice.Of(places);
            if (field.IsRepeated)
                ChangeList((IList)field.Accessor.GetValue(owner), field, dice);
            else if (dice.OnceIn(12))
                field.Accessor.Clear(owner);
            else
                field.Accessor.SetValue(owner, Single(owner, field, dice));
        }
    }

    private static void Collect(IMessage message, List<(IMessage Owner, FieldDescriptor Field)> places, int depth)
    {
        foreach (var field in message.Descriptor.Fields.InDeclarationOrder())
        {
            places.Add((message, field));
            if (field.FieldType != FieldType.Message || depth == DeepestPlace)
                continue;
            if (field.IsRepeated)
            {
                foreach (var item in ((IList)field.Accessor.GetValue(message)).Cast<IMessage>().Take(40))
                    Collect(item, places, depth + 1);
            }
            else if (field.Accessor.GetValue(message) is IMessage inner)
            {
                Collect(inner, places, depth + 1);
            }
        }
    }

    private static object Single(IMessage owner, FieldDescriptor field, Dice dice) => field.FieldType switch
    {
        FieldType.Double => HostileNumbers.For(field.Name, (double)field.Accessor.GetValue(owner), dice),
        FieldType.Bool => dice.OnceIn(2),
        FieldType.Int32 => dice.Of([0, 1, -1, 2, 999, 1000, 1001, int.MaxValue, int.MinValue]),
        FieldType.Enum => Enum.ToObject(field.EnumType.ClrType, dice.Of([0, 1, 2, 3, 5, 17, -1, int.MaxValue, int.MinValue])),
        FieldType.String => Vocabulary.For(field.Name, dice),
        FieldType.Message => New(field, dice),
        _ => throw new InvalidOperationException($"no request holds a {field.FieldType} yet: say how to change {field.FullName}"),
    };

    /// <summary>A new message of the field's type, filled most of the time.</summary>
    private static IMessage New(FieldDescriptor field, Dice dice)
    {
        var created = field.MessageType.Parser.ParseFrom([]);
        if (dice.OnceIn(5))
            return created;
        foreach (var inner in field.MessageType.Fields.InDeclarationOrder())
        {
            if (!inner.IsRepeated && !dice.OnceIn(4))
                inner.Accessor.SetValue(created, inner.FieldType == FieldType.Double ? HostileNumbers.Within(inner.Name, dice) : Single(created, inner, dice));
        }

        return created;
    }

    private static void ChangeList(IList list, FieldDescriptor field, Dice dice)
    {
        switch (dice.Throw(10))
        {
            case 0:
                list.Clear();
                break;
            case 1 when list.Count > 0:
                list.RemoveAt(dice.Throw(list.Count));
                break;
            case 2 when list.Count > 0:
                Grow(list, () => Copy(list[dice.Throw(list.Count)]!), dice.OnceIn(40) ? 5000 : dice.OnceIn(4) ? 201 : 3);
                break;
            case 3 or 4 when list.Count > 1:
                var (first, second) = (dice.Throw(list.Count), dice.Throw(list.Count));
                (list[first], list[second]) = (list[second], list[first]);
                break;
            default:
                Grow(list, () => New(field, dice), dice.OnceIn(100) ? 201 : 1 + dice.Throw(6));
                break;
        }
    }

    private static void Grow(IList list, Func<IMessage> create, int by)
    {
        for (; by > 0; by--)
            list.Add(create());
    }

    private static IMessage Copy(object item)
    {
        var message = (IMessage)item;
        return message.Descriptor.Parser.ParseFrom(message.ToByteArray());
    }
}

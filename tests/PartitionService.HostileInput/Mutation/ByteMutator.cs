namespace PartitionService.HostileInput.Mutation;

/// <summary>Changes bytes without knowing what they mean.</summary>
public static class ByteMutator
{
    /// <summary>Changes one to eight places, or replaces everything.</summary>
    public static byte[] Change(byte[] valid, Dice dice)
    {
        if (valid.Length == 0 || dice.OnceIn(10))
            return dice.Bytes(dice.Throw(300));
        List<byte> bytes = [.. valid];
        for (var changes = 1 + dice.Throw(8); changes > 0 && bytes.Count > 0; changes--)
        {
            var at = dice.Throw(bytes.Count);
            switch (dice.Throw(7))
            {
                case 0:
                    bytes[at] ^= (byte)(1 << dice.Throw(8));
                    break;
                case 1:
                    bytes[at] = (byte)dice.Throw(256);
                    break;
                case 2:
                    bytes.InsertRange(at, dice.Bytes(1 + dice.Throw(12)));
                    break;
                case 3:
                    bytes.RemoveRange(at, Math.Min(bytes.Count - at, 1 + dice.Throw(20)));
                    break;
                case 4:
                    bytes.RemoveRange(at, bytes.Count - at);
                    break;
                case 5:
                    bytes.InsertRange(at, valid.Take(dice.Throw(valid.Length)));
                    break;
                default:
                    // A length or a tag that promises more than follows.
                    bytes.InsertRange(at, [0xFF, 0xFF, 0xFF, 0xFF, 0x7F]);
                    break;
            }
        }

        return [.. bytes];
    }
}

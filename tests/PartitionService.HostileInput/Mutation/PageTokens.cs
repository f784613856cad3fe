namespace PartitionService.HostileInput.Mutation;

/// <summary>Page tokens of every kind: genuine ones of other lists, genuine ones with a changed byte, and rubbish.</summary>
public static class PageTokens
{
    private const string Alphabet = "ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789-_";

    /// <summary>A token, given some that the service issued.</summary>
    public static string Any(IReadOnlyList<string> genuine, Dice dice)
    {
        switch (dice.Throw(6))
        {
            case 0:
                return dice.Of(genuine);
            case 1:
                var letters = dice.Of(genuine).ToCharArray();
                letters[dice.Throw(letters.Length)] = dice.Of([.. Alphabet]);
                return new string(letters);
            case 2:
                return dice.Of(genuine) + dice.Of(["=", "==", " ", "\n", "A", "\0"]);
            case 3:
                return string.Concat(Enumerable.Range(0, dice.Throw(80)).Select(_ => dice.Of([.. Alphabet])));
            case 4:
                return dice.Of(genuine)[..dice.Throw(30)];
            default:
                return HostileTexts.Any(dice);
        }
    }
}

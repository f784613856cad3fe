namespace PartitionService.Cli;

/// <summary>What the tool tells the shell. The numbers are stable.</summary>
internal static class ExitCode
{
    /// <summary>Done.</summary>
    public const int Success = 0;

    /// <summary>A fault of the tool or of the service.</summary>
    public const int Unexpected = 1;

    /// <summary>The command line, a case file or an output file cannot be used.</summary>
    public const int WrongInput = 2;

    /// <summary>The service refuses fields of the case or of the request.</summary>
    public const int InvalidCase = 3;

    /// <summary>The case is valid but a condition that it states cannot hold.</summary>
    public const int CannotHold = 4;

    /// <summary>The service cannot be reached.</summary>
    public const int Unavailable = 5;

    /// <summary>The deadline passed or the service cancelled the call.</summary>
    public const int OutOfTime = 6;

    /// <summary>The catalogue has no such datum.</summary>
    public const int UnknownDatum = 7;

    /// <summary>Interrupted from the keyboard (Ctrl-C).</summary>
    public const int Interrupted = 130;

    /// <summary>Asked to end by the system (SIGTERM).</summary>
    public const int Terminated = 143;

    /// <summary>The list for the help pages.</summary>
    public const string Help =
        """
        Exit status:
          0    done
          1    a fault of the tool or of the service
          2    the command line, a case file or an output file cannot be used
          3    the service refuses fields of the case or of the request
          4    the case is valid but a condition that it states cannot hold
          5    the service cannot be reached
          6    the deadline passed or the service cancelled the call
          7    the catalogue has no such datum
          130  interrupted from the keyboard (Ctrl-C)
          143  asked to end by the system (SIGTERM)
        """;
}

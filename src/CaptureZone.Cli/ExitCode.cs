namespace CaptureZone.Cli;

/// <summary>What the program says to whoever called it.</summary>
internal static class ExitCode
{
    /// <summary>Done.</summary>
    public const int Done = 0;

    /// <summary>A defect inside the program, or results that do not pass the calculation's own checks.</summary>
    public const int Defect = 1;

    /// <summary>The command line or the site is wrong.</summary>
    public const int Wrong = 2;

    /// <summary>Capture was required and is not predicted.</summary>
    public const int NotCaptured = 3;

    /// <summary>Something could not be read or written.</summary>
    public const int NoAccess = 4;

    /// <summary>Interrupted from the keyboard: 128 + SIGINT.</summary>
    public const int Interrupted = 130;

    /// <summary>Asked to end by the system: 128 + SIGTERM.</summary>
    public const int Terminated = 143;
}

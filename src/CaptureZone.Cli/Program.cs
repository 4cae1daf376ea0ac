namespace CaptureZone.Cli;

/// <summary>The command line's entry point.</summary>
public static class Program
{
    /// <summary>Runs one command and gives its exit code.</summary>
    public static int Main(string[] args)
    {
        using Surroundings surroundings = Surroundings.OfProcess();
        return CommandLine.Run(args, surroundings);
    }
}

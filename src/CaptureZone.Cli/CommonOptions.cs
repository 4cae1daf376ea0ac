using System.CommandLine;
using System.CommandLine.Parsing;
using System.Globalization;

namespace CaptureZone.Cli;

/// <summary>Options that several commands share.</summary>
internal static class CommonOptions
{
    /// <summary>The site file.</summary>
    public static Argument<string> Site() => new("SITE") { Description = "The site file (TOML); \"-\" reads it from standard input." };

    /// <summary>Prints nothing but errors and the data asked for.</summary>
    public static readonly Option<bool> Quiet = new("--quiet", "-q")
    {
        Description = "Print nothing but errors and the data asked for.",
        Recursive = true,
    };

    /// <summary>No colours.</summary>
    public static readonly Option<bool> NoColor = new("--no-color")
    {
        Description = "No colours; the environment variable NO_COLOR does the same.",
        Recursive = true,
    };

    /// <summary>The summary as JSON.</summary>
    public static readonly Option<bool> Json = new("--json")
    {
        Description = "Print the summary as JSON on standard output.",
        Recursive = true,
    };

    /// <summary>Where a defect shows.</summary>
    public static readonly Option<bool> Trace = new("--trace")
    {
        Description = "After a defect inside the program, print where it happened, for a report.",
        Recursive = true,
    };

    /// <summary>How many threads.</summary>
    public static Option<int?> Threads() => new("--threads")
    {
        Description = "Use at most so many threads; the results are the same for any number. [default: all processors]",
        HelpName = "N",
        CustomParser = ParseThreads,
    };

    /// <summary>Whether what someone changed may be replaced.</summary>
    /// <param name="description">What would be lost.</param>
    public static Option<bool> Replace(string description) => new("--replace") { Description = description };

    /// <summary>Where the result goes.</summary>
    /// <param name="description">What goes there.</param>
    public static Option<string?> Out(string description) => new("--out", "-o") { Description = description, HelpName = "PATH" };

    private static int? ParseThreads(ArgumentResult argument)
    {
        string text = argument.Tokens[0].Value;
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out int threads) && threads > 0)
        {
            return threads;
        }

        argument.AddError($"--threads is \"{text}\"; expected a whole number from 1");
        return null;
    }
}

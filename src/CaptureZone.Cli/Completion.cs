using System.CommandLine;
using System.CommandLine.Completions;
using System.Globalization;

namespace CaptureZone.Cli;

/// <summary>
/// Answers a shell that asks how a line may go on: <c>capturezone [suggest:N] "the line"</c>, N being where the cursor stands.
/// </summary>
internal static class Completion
{
    private const string Ask = "[suggest";

    /// <summary>Whether a shell asks.</summary>
    /// <param name="args">The arguments.</param>
    public static bool IsAsked(IReadOnlyList<string> args) => args.Count > 0 && args[0].StartsWith(Ask, StringComparison.Ordinal);

    /// <summary>Prints the ways in which the line may go on, one to a line.</summary>
    /// <param name="root">The root command.</param>
    /// <param name="args">The arguments.</param>
    /// <param name="output">Where to.</param>
    /// <returns>The exit code.</returns>
    public static int Answer(Command root, IReadOnlyList<string> args, TextWriter output)
    {
        string line = args.Count > 1 ? args[1] : "";
        ReadOnlySpan<char> number = args[0].AsSpan(Ask.Length).Trim(":]");
        int position = int.TryParse(number, NumberStyles.None, CultureInfo.InvariantCulture, out int at) ? at : line.Length;
        foreach (CompletionItem item in root.Parse(line, CommandLine.Parsing).GetCompletions(Math.Min(position, line.Length)))
        {
            output.WriteLine(item.Label);
        }

        return ExitCode.Done;
    }
}

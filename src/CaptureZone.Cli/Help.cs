using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;

namespace CaptureZone.Cli;

/// <summary>A command whose help shows examples.</summary>
/// <param name="name">Its name.</param>
/// <param name="description">What it gives.</param>
/// <param name="examples">Whole command lines.</param>
internal sealed class ExplainedCommand(string name, string description, params string[] examples) : Command(name, description)
{
    /// <summary>Whole command lines.</summary>
    public IReadOnlyList<string> Examples { get; } = examples;
}

/// <summary>Help with examples and exit codes.</summary>
internal static class Help
{
    private const int Width = 100;

    private static readonly string[] _rootExamples =
    [
        "capturezone new mysite.toml          begin with a site file that runs as it stands",
        "capturezone check mysite.toml        see everything that is wrong with it",
        "capturezone run mysite.toml          all results into mysite-results/",
    ];

    private static readonly string[] _exitCodes =
    [
        "0    done",
        "1    a defect inside the program, or results that do not pass the calculation's own checks",
        "2    the command line or the site is wrong, a dewatered well included",
        "3    with --require-capture: a plume is not captured",
        "4    something could not be read or written",
        "130  interrupted; 143  terminated",
    ];

    /// <summary>Adds examples and exit codes to the help of a root command and of all below it.</summary>
    /// <param name="root">The root command.</param>
    public static void AddTo(Command root)
    {
        HelpOption help = new("--help", "-h", "-?") { Description = "Show this help." };
        help.Action = new ExplainedHelp((HelpAction)help.Action!);
        root.Options.Add(help);
        root.Options.Add(new VersionOption { Description = "Show the version.", Action = new ShowVersion() });
    }

    private static void WriteSection(TextWriter to, string title, IEnumerable<string> lines)
    {
        to.WriteLine(title);
        foreach (string line in lines)
        {
            to.WriteLine("  " + line);
        }

        to.WriteLine();
    }

    private sealed class ExplainedHelp(HelpAction inner) : SynchronousCommandLineAction
    {
        public override bool ClearsParseErrors => true;

        public override int Invoke(ParseResult parseResult)
        {
            inner.MaxWidth = Width;
            int code = inner.Invoke(parseResult);
            TextWriter to = parseResult.InvocationConfiguration.Output;
            WriteSection(
                to, "Examples:", parseResult.CommandResult.Command is ExplainedCommand command ? command.Examples : _rootExamples);
            WriteSection(to, "Exit codes:", _exitCodes);
            return code;
        }
    }

    private sealed class ShowVersion : SynchronousCommandLineAction
    {
        public override bool ClearsParseErrors => true;

        public override int Invoke(ParseResult parseResult)
        {
            parseResult.InvocationConfiguration.Output.WriteLine($"{CommandLine.Name} {Jobs.ProgramVersion.Text}");
            return ExitCode.Done;
        }
    }
}

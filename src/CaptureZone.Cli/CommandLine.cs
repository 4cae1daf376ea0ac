using System.CommandLine;
using System.CommandLine.Invocation;
using CaptureZone.Cli.Commands;

namespace CaptureZone.Cli;

/// <summary>The command line: parses it, runs the command, says what is wrong with it.</summary>
public static class CommandLine
{
    /// <summary>The program's name.</summary>
    internal const string Name = "capturezone";

    /// <summary>Runs one command.</summary>
    /// <param name="args">The arguments.</param>
    /// <param name="surroundings">The world around.</param>
    /// <returns>The exit code.</returns>
    public static int Run(IReadOnlyList<string> args, Surroundings surroundings)
    {
        ParseResult line = Build(surroundings).Parse(args, new ParserConfiguration
        {
            ResponseFileTokenReplacer = null, // an argument that begins with @ means itself
            EnablePosixBundling = false,
        });
        InvocationConfiguration configuration = new()
        {
            Output = surroundings.Output,
            Error = surroundings.Error,
            EnableDefaultExceptionHandler = false,
            ProcessTerminationTimeout = null, // signals are the surroundings' affair
        };
        return line.Action is ParseErrorAction errors ? Complain(line, errors, surroundings) : line.Invoke(configuration);
    }

    private static RootCommand Build(Surroundings surroundings)
    {
        RootCommand root = new(
            "Screening-level analysis of ground-water capture zones: from one site file to zones, maps, GIS files and a memo.");
        root.Options.Add(CommonOptions.Quiet);
        root.Options.Add(CommonOptions.NoColor);
        root.Options.Add(CommonOptions.Json);
        root.Options.Add(CommonOptions.Trace);
        root.Subcommands.Add(NewCommand.Create(surroundings));
        root.Subcommands.Add(CheckCommand.Create(surroundings));
        root.Subcommands.Add(RunCommand.Create(surroundings));
        root.Subcommands.Add(HeadsCommand.Create(surroundings));
        root.Subcommands.Add(PathsCommand.Create(surroundings));
        Help.AddTo(root);
        return root;
    }

    /// <summary>Everything about a wrong command line goes to standard error, suggestions included.</summary>
    private static int Complain(ParseResult line, ParseErrorAction errors, Surroundings surroundings)
    {
        TextWriter error = surroundings.Error;
        foreach (System.CommandLine.Parsing.ParseError complaint in line.Errors)
        {
            error.WriteLine($"{Name}: error: {complaint.Message}");
        }

        errors.ShowHelp = false;
        line.Invoke(new InvocationConfiguration { Output = error, Error = TextWriter.Null, EnableDefaultExceptionHandler = false });
        Command command = line.CommandResult.Command;
        error.WriteLine($"Try: {Name} {(command is RootCommand ? "" : command.Name + " ")}--help");
        return ExitCode.Wrong;
    }
}

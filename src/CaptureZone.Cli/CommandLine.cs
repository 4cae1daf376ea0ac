using System.CommandLine;
using System.CommandLine.Invocation;
using CaptureZone.Cli.Commands;

namespace CaptureZone.Cli;

/// <summary>The command line: parses it, runs the command, says what is wrong with it.</summary>
public static class CommandLine
{
    /// <summary>The program's name.</summary>
    internal const string Name = "capturezone";

    /// <summary>How arguments are read: each means itself, one that begins with @ too.</summary>
    internal static readonly ParserConfiguration Parsing = new() { ResponseFileTokenReplacer = null, EnablePosixBundling = false };

    /// <summary>Runs one command.</summary>
    /// <param name="args">The arguments.</param>
    /// <param name="surroundings">The world around.</param>
    /// <returns>The exit code.</returns>
    public static int Run(IReadOnlyList<string> args, Surroundings surroundings)
    {
        Command root = Build(surroundings);
        if (Completion.IsAsked(args))
        {
            return Completion.Answer(root, args, surroundings.Output);
        }

        if (args.Count == 0)
        {
            root.Parse(["--help"], Parsing).Invoke(new InvocationConfiguration { Output = surroundings.Error });
            return ExitCode.Wrong;
        }

        ParseResult line = root.Parse(args, Parsing);
        InvocationConfiguration configuration = new()
        {
            Output = surroundings.Output,
            Error = surroundings.Error,
            EnableDefaultExceptionHandler = false,
            ProcessTerminationTimeout = null, // signals are the surroundings' affair
        };
        return line.Action is ParseErrorAction errors ? Complain(line, errors, surroundings) : line.Invoke(configuration);
    }

    private static Command Build(Surroundings surroundings)
    {
        // Not a RootCommand: that one takes its name from the file that the program lies in.
        Command root = new(
            Name,
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
        error.WriteLine($"Try: {Name} {(command.Name == Name ? "" : command.Name + " ")}--help");
        return ExitCode.Wrong;
    }
}

using System.CommandLine;
using CaptureZone.Jobs;

namespace CaptureZone.Cli.Commands;

/// <summary><c>new FILE</c>: a site file to begin with.</summary>
internal static class NewCommand
{
    private static readonly Argument<string> _file = new("FILE")
    {
        Description = "The site file to write; an existing file is never overwritten. \"-\" writes to standard output.",
    };

    private static readonly Option<bool> _us = new("--us") { Description = "In US customary units: ft, ft/d, gpm." };

    /// <summary>Makes the command.</summary>
    /// <param name="surroundings">The world around.</param>
    public static Command Create(Surroundings surroundings)
    {
        ExplainedCommand command = new(
            "new",
            "Write a commented site file that runs as it stands.",
            "capturezone new mysite.toml",
            "capturezone new --us mysite.toml",
            "capturezone new - | capturezone check -");
        command.Arguments.Add(_file);
        command.Options.Add(_us);
        command.SetAction(Session.Action(surroundings, Run));
        return command;
    }

    private static int Run(Session session)
    {
        string file = session.Line.GetRequiredValue(_file);
        bool us = session.Line.GetValue(_us);
        if (file == Session.StandardStream)
        {
            session.Output.Write(NewJob.Text(us));
            return ExitCode.Done;
        }

        NewJob.Write(file, us);
        if (!session.Quiet)
        {
            Summary.WriteNew(session, file);
        }

        return ExitCode.Done;
    }
}

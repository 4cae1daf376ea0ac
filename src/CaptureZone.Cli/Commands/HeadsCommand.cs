using System.Collections.Immutable;
using System.CommandLine;
using CaptureZone.Jobs.Heads;
using CaptureZone.Jobs.Summaries;
using CaptureZone.Sites;

namespace CaptureZone.Cli.Commands;

/// <summary><c>heads SITE</c>: head and flow at points.</summary>
internal static class HeadsCommand
{
    private static readonly Argument<string> _site = CommonOptions.Site();

    private static readonly PointOptions _points = new();

    private static readonly Option<string?> _out = CommonOptions.Out("Write the table to this file instead of standard output.");

    private static readonly Option<bool> _replace = CommonOptions.Replace("Overwrite an existing file.");

    /// <summary>Makes the command.</summary>
    /// <param name="surroundings">The world around.</param>
    public static Command Create(Surroundings surroundings)
    {
        ExplainedCommand command = new(
            "heads",
            "Give head, saturated thickness, discharge and velocity of ground water at points, as CSV in metres and days.",
            "capturezone heads mysite.toml --at 562310,4641240",
            "capturezone heads mysite.toml --points monitoring.csv --out heads.csv",
            "capturezone heads mysite.toml --points - < monitoring.csv");
        command.Arguments.Add(_site);
        _points.AddTo(command);
        command.Options.Add(_out);
        command.Options.Add(_replace);
        command.SetAction(Session.Action(surroundings, Run));
        return command;
    }

    private static int Run(Session session)
    {
        ParseResult line = session.Line;
        string path = line.GetRequiredValue(_site);
        SiteDocument site = SiteSource.Read(session, path);
        ImmutableArray<HeadRow> rows = HeadsJob.At(site, _points.Read(session, path));
        TableOutput.Write(
            session,
            line.GetValue(_out),
            line.GetValue(_replace),
            to => HeadsCsv.Write(rows, to),
            to => SummaryJson.WriteHeads(rows, to));
        return ExitCode.Done;
    }
}

using System.Collections.Immutable;
using System.CommandLine;
using System.CommandLine.Parsing;
using CaptureZone.Jobs.Files;
using CaptureZone.Jobs.Paths;
using CaptureZone.Jobs.Points;
using CaptureZone.Jobs.Summaries;
using CaptureZone.Sites;
using CaptureZone.Sites.Units;
using CaptureZone.Tracing;

namespace CaptureZone.Cli.Commands;

/// <summary><c>paths SITE</c>: where water goes to, or comes from.</summary>
internal static class PathsCommand
{
    private static readonly Argument<string> _site = CommonOptions.Site();

    private static readonly PointOptions _points = new();

    private static readonly Option<bool> _upstream = new("--upstream") { Description = "Follow the water back to where it comes from." };

    private static readonly Option<double?> _for = new("--for")
    {
        Description = "Follow the water for at most this time, such as \"10 yr\" or \"90 d\". [default: to the end]",
        HelpName = "TIME",
        CustomParser = ParseTime,
    };

    private static readonly Option<string?> _lines = new("--lines")
    {
        Description = "Write the paths as lines, with the time at each vertex, to this GeoJSON file.",
        HelpName = "F.geojson",
    };

    private static readonly Option<string?> _out = CommonOptions.Out("Write the table to this file instead of standard output.");

    private static readonly Option<bool> _replace = CommonOptions.Replace("Overwrite existing files.");

    private static readonly Option<int?> _threads = CommonOptions.Threads();

    /// <summary>Makes the command.</summary>
    /// <param name="surroundings">The world around.</param>
    public static Command Create(Surroundings surroundings)
    {
        ExplainedCommand command = new(
            "paths",
            "Follow water from points to its end, as CSV of ends and fates in metres and days.",
            "capturezone paths mysite.toml --at 562310,4641240",
            "capturezone paths mysite.toml --points spills.csv --for \"10 yr\" --lines paths.geojson",
            "capturezone paths mysite.toml --at 562310,4641240 --upstream");
        command.Arguments.Add(_site);
        _points.AddTo(command);
        command.Options.Add(_upstream);
        command.Options.Add(_for);
        command.Options.Add(_lines);
        command.Options.Add(_out);
        command.Options.Add(_replace);
        command.Options.Add(_threads);
        command.SetAction(Session.Action(surroundings, Run));
        return command;
    }

    private static int Run(Session session)
    {
        ParseResult line = session.Line;
        string path = line.GetRequiredValue(_site);
        bool replace = line.GetValue(_replace);
        SiteDocument site = SiteSource.Read(session, path);
        ImmutableArray<NamedPoint> points = _points.Read(session, path);
        RefuseTaken(line, replace);
        string? lines = line.GetValue(_lines);
        PathsRequest request = new(
            line.GetValue(_upstream) ? Sense.Upstream : Sense.Downstream,
            line.GetValue(_for) ?? double.PositiveInfinity,
            Lines: lines is not null);
        ImmutableArray<PathRow> rows = session.WithProgress(
            line.GetValue(_threads), work => PathsJob.Follow(site, points, request, work));
        if (lines is not null)
        {
            WholeFile.Write(lines, replace, stream => PathLines.Write(site, rows, stream));
        }

        TableOutput.Write(
            session,
            line.GetValue(_out),
            replace,
            to => PathsCsv.Write(site, rows, to),
            to => SummaryJson.WritePaths(site, rows, to));
        return ExitCode.Done;
    }

    /// <summary>Declines both places before either is written.</summary>
    private static void RefuseTaken(ParseResult line, bool replace)
    {
        foreach (string? place in new[] { line.GetValue(_lines), line.GetValue(_out) })
        {
            if (place is not (null or Session.StandardStream))
            {
                WholeFile.Refuse(place, replace);
            }
        }
    }

    private static double? ParseTime(ArgumentResult argument)
    {
        string text = argument.Tokens[0].Value;
        if (UnitTable.TryRead(text, Dimension.Time, out double days, out string problem) && days > 0)
        {
            return days;
        }

        argument.AddError($"--for: {(problem.Length > 0 ? problem : $"\"{text}\" is not above 0")}");
        return null;
    }
}

using System.CommandLine;
using CaptureZone.Jobs;
using CaptureZone.Jobs.Runs;
using CaptureZone.Jobs.Summaries;
using CaptureZone.Outputs;
using CaptureZone.Sites;

namespace CaptureZone.Cli.Commands;

/// <summary><c>run SITE</c>: all results into a folder.</summary>
internal static class RunCommand
{
    private static readonly Argument<string> _site = CommonOptions.Site();

    private static readonly Option<string?> _out = CommonOptions.Out(
        "The result folder. [default: the site file's name and \"-results\", beside it]");

    private static readonly Option<bool> _replace = CommonOptions.Replace(
        "Replace a result folder even though files in it were changed or added.");

    private static readonly Option<bool> _shapefiles = new("--shapefiles") { Description = "Write the GIS layers as Shapefiles too." };

    private static readonly Option<bool> _requireCapture = new("--require-capture")
    {
        Description = "Exit with 3 unless every plume is predicted to be captured.",
    };

    private static readonly Option<int?> _threads = CommonOptions.Threads();

    /// <summary>Makes the command.</summary>
    /// <param name="surroundings">The world around.</param>
    public static Command Create(Surroundings surroundings)
    {
        ExplainedCommand command = new(
            "run",
            "Compute capture zones, travel-time zones and plume verdicts, and write maps, GIS files and the memo into a folder.",
            "capturezone run mysite.toml",
            "capturezone run mysite.toml --out results/july --shapefiles",
            "capturezone run mysite.toml --require-capture --json > summary.json");
        command.Arguments.Add(_site);
        command.Options.Add(_out);
        command.Options.Add(_replace);
        command.Options.Add(_shapefiles);
        command.Options.Add(_requireCapture);
        command.Options.Add(_threads);
        command.SetAction(Session.Action(surroundings, Run));
        return command;
    }

    private static int Run(Session session)
    {
        ParseResult line = session.Line;
        string path = line.GetRequiredValue(_site);
        SiteDocument site = SiteSource.Read(session, path);
        bool requireCapture = line.GetValue(_requireCapture);
        if (requireCapture && site.Questions.Plumes.IsEmpty)
        {
            throw new RequestException("--require-capture needs a [[plume]] in the site file; there is none");
        }

        RunRequest request = new(
            line.GetValue(_out) ?? SiteSource.ResultFolder(path), line.GetValue(_replace), line.GetValue(_shapefiles));
        Report report = session.WithProgress(line.GetValue(_threads), work => session.RunJob.Run(site, request, work));
        Show(session, report, request);
        return CodeOf(session, report.Answers, requireCapture);
    }

    private static void Show(Session session, Report report, RunRequest request)
    {
        if (session.Json)
        {
            SummaryJson.WriteRun(report, request, session.Output);
        }
        else if (!session.Quiet)
        {
            RunSummary.Write(report, request, session.Output);
        }
    }

    private static int CodeOf(Session session, SiteAnswers answers, bool requireCapture)
    {
        if (answers.Checks.FirstOrDefault(check => !check.Passed) is { } failed)
        {
            session.Error($"the calculation does not pass its own check \"{failed.Name}\"; do not rely on these results");
            return ExitCode.Defect;
        }

        return requireCapture && answers.Plumes.Any(plume => !plume.Captured) ? ExitCode.NotCaptured : ExitCode.Done;
    }
}

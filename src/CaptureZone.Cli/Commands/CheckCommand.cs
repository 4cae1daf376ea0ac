using System.Collections.Immutable;
using System.CommandLine;
using CaptureZone.Jobs;
using CaptureZone.Jobs.Summaries;
using CaptureZone.Sites;

namespace CaptureZone.Cli.Commands;

/// <summary><c>check SITE</c>: everything wrong with a site file, or the site as understood.</summary>
internal static class CheckCommand
{
    private static readonly Argument<string> _site = CommonOptions.Site();

    private static readonly Option<bool> _strict = new("--strict") { Description = "Fail on warnings too." };

    /// <summary>Makes the command.</summary>
    /// <param name="surroundings">The world around.</param>
    public static Command Create(Surroundings surroundings)
    {
        ExplainedCommand command = new(
            "check",
            "Say everything that is wrong with a site file at once, or show the site as understood, in the report's units.",
            "capturezone check mysite.toml",
            "capturezone check --strict mysite.toml",
            "capturezone check --json mysite.toml");
        command.Arguments.Add(_site);
        command.Options.Add(_strict);
        command.SetAction(Session.Action(surroundings, Run));
        return command;
    }

    private static int Run(Session session)
    {
        SiteInput input = SiteSource.Open(session, session.Line.GetRequiredValue(_site));
        SiteDocument site;
        try
        {
            site = CheckJob.Check(input);
        }
        catch (InputRefusedException refused)
        {
            Show(session, null, refused.Complaints);
            return ExitCode.Wrong;
        }

        bool fails = session.Line.GetValue(_strict) && !site.Warnings.IsEmpty;
        Show(session, site, site.Warnings);
        return fails ? ExitCode.Wrong : ExitCode.Done;
    }

    private static void Show(Session session, SiteDocument? site, ImmutableArray<Complaint> complaints)
    {
        session.Complain(complaints);
        if (session.Json)
        {
            SummaryJson.WriteCheck(site, complaints, session.Output);
        }
        else if (site is not null && !session.Quiet)
        {
            CheckSummary.Write(site, session.Output);
        }
    }
}

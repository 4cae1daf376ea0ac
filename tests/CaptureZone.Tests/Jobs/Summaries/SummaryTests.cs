using CaptureZone.Jobs.Runs;
using CaptureZone.Jobs.Summaries;
using CaptureZone.Outputs;
using CaptureZone.Sites;
using CaptureZone.Tests.Cli;
using CaptureZone.Tests.Outputs;

namespace CaptureZone.Tests.Jobs.Summaries;

public sealed class SummaryTests
{
    private static readonly RunRequest _request = new("larch-hollow-results", Replace: false, Shapefiles: true);

    [Theory]
    [InlineData(ReportUnits.Metric)]
    [InlineData(ReportUnits.Us)]
    public void The_summary_of_a_run_reads_as_approved(ReportUnits units) =>
        Verify($"summary-{units}", to => RunSummary.Write(SampleReport.Create(units), _request, to));

    [Fact]
    public void A_failed_check_is_said_first()
    {
        Report sample = SampleReport.Create();
        Report failed = sample with
        {
            Answers = sample.Answers with { Checks = [new Check("side flow of RW-1, share of its rate", 0.002, 0.001)] },
        };
        Verify("summary-failed", to => RunSummary.Write(failed, _request, to));
    }

    [Fact]
    public void The_summary_as_JSON_reads_as_approved() =>
        Verify("summary-json", to => SummaryJson.WriteRun(SampleReport.Create(), _request, to));

    [Fact]
    public void What_was_understood_of_a_site_reads_as_approved() =>
        Verify("check", to => CheckSummary.Write(SampleReport.Create(ReportUnits.Us).Site, to));

    private static void Verify(string name, Action<TextWriter> write)
    {
        StringWriter to = new() { NewLine = "\n" };
        write(to);
        Approval.Verify(name, to.ToString());
    }
}

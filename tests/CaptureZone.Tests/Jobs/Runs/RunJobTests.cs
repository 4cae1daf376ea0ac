using CaptureZone.Flow;
using CaptureZone.Jobs;
using CaptureZone.Jobs.Runs;
using CaptureZone.Outputs;
using CaptureZone.Tests.Outputs;

namespace CaptureZone.Tests.Jobs.Runs;

public sealed class RunJobTests : IDisposable
{
    private static readonly Report _sample = SampleReport.Create();
    private static readonly RunJob _job = new((_, _, _, _, _) => _sample.Answers);

    private readonly TempFolder _temp = new();

    public void Dispose() => _temp.Dispose();

    [Fact]
    public void A_run_writes_every_file_of_the_contract()
    {
        Run(_job, "out", shapefiles: true);
        string[] files =
        [
            "out/results.json", "out/capture_zones.geojson", "out/travel_time_zones.geojson", "out/paths.geojson",
            "out/stagnation_points.geojson", "out/head_contours.geojson", "out/gis.gpkg", "out/map.png", "out/map.svg",
            "out/memo.docx", "out/memo.md", "out/shapefiles",
        ];
        Assert.Subset(_temp.Entries.ToHashSet(), files.ToHashSet());
    }

    [Fact]
    public void Two_runs_write_the_same_bytes_whatever_the_number_of_threads()
    {
        Run(_job, "one");
        Run(_job, "two", workers: new ThreadWorkers(2));
        string[] files = [.. _temp.Entries.Where(entry => entry.StartsWith("one/", StringComparison.Ordinal)).Select(entry => entry[4..])];
        Assert.NotEmpty(files);
        Assert.All(files, file => Assert.Equal(File.ReadAllBytes(_temp["one/" + file]), File.ReadAllBytes(_temp["two/" + file])));
    }

    [Fact]
    public async Task A_run_that_is_stopped_while_a_worker_is_busy_leaves_nothing()
    {
        using CancellationTokenSource stop = new();
        using ManualResetEventSlim busy = new();
        RunJob job = new((_, _, _, _, cancel) =>
        {
            busy.Set();
            cancel.WaitHandle.WaitOne();
            cancel.ThrowIfCancellationRequested();
            return _sample.Answers;
        });
        Task run = Task.Run(() => Run(job, "out", cancel: stop.Token));
        busy.Wait();
        Assert.StartsWith("out.new-", _temp.Entries.First(), StringComparison.Ordinal);
        await stop.CancelAsync();
        await Assert.ThrowsAnyAsync<OperationCanceledException>(() => run);
        Assert.Empty(_temp.Entries);
    }

    [Fact]
    public void A_run_that_is_stopped_while_it_writes_leaves_nothing()
    {
        using CancellationTokenSource stop = new();
        StopAt progress = new("writing the memo", stop);
        Assert.ThrowsAny<OperationCanceledException>(() => Run(_job, "out", progress: progress, cancel: stop.Token));
        Assert.Empty(_temp.Entries);
    }

    [Fact]
    public void A_calculation_that_fails_leaves_nothing_and_keeps_what_was_there()
    {
        Run(_job, "out");
        string[] before = _temp.Entries;
        RunJob job = new((_, _, _, _, _) => throw new InvalidOperationException());
        Assert.Throws<InvalidOperationException>(() => Run(job, "out"));
        Assert.Equal(before, _temp.Entries);
    }

    [Fact]
    public void Progress_of_writing_follows_that_of_the_calculation()
    {
        List<double> fractions = [];
        RunJob job = new((_, _, _, progress, _) =>
        {
            progress!.Report(new Step("tracing", 0));
            progress.Report(new Step("tracing", 1));
            return _sample.Answers;
        });
        Run(job, "out", progress: new Recorder(fractions));
        Assert.Equal(0, fractions[0]);
        Assert.All(fractions.Skip(2), fraction => Assert.InRange(fraction, fractions[1], 1));
    }

    private void Run(
        RunJob job,
        string name,
        bool shapefiles = false,
        IWorkers? workers = null,
        IProgress<Step>? progress = null,
        CancellationToken cancel = default) =>
        job.Run(
            _sample.Site,
            new RunRequest(_temp[name], Replace: false, shapefiles),
            new Work(workers ?? new OneWorker(), progress, cancel));

    private sealed class StopAt(string step, CancellationTokenSource stop) : IProgress<Step>
    {
        public void Report(Step value)
        {
            if (value.Name == step)
            {
                stop.Cancel();
            }
        }
    }

    private sealed class Recorder(List<double> fractions) : IProgress<Step>
    {
        public void Report(Step value) => fractions.Add(value.Fraction);
    }
}

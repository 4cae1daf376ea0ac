using System.Diagnostics;
using System.Globalization;
using CaptureZone.Tests.Jobs;

namespace CaptureZone.Tests.Cli;

public sealed class SignalTests : IDisposable
{
    /// <summary>Paths enough for many seconds of work on any machine.</summary>
    private const int ManyPoints = 400_000;

    private readonly TempFolder _temp = new();

    public void Dispose() => _temp.Dispose();

    [Fact]
    public async Task A_process_that_is_asked_to_end_ends_with_143_and_leaves_nothing()
    {
        if (OperatingSystem.IsWindows())
        {
            return; // there is no such signal
        }

        CliRun.Of("new", _temp["a.toml"]);
        _temp.Write("p.csv", "name,x,y\n" + string.Concat(Enumerable.Range(0, ManyPoints).Select(i =>
            string.Create(CultureInfo.InvariantCulture, $"P{i},{-500 - i % 1000},{i % 777}\n"))));
        string program = Path.Combine(AppContext.BaseDirectory, "CaptureZone.Cli.dll");
        using Process process = Process.Start(new ProcessStartInfo(
            "dotnet", [program, "paths", _temp["a.toml"], "--points", _temp["p.csv"], "--out", _temp["o.csv"]])
        {
            RedirectStandardError = true,
        })!;
        Assert.Equal("capturezone: following paths ...", await process.StandardError.ReadLineAsync());
        using (Process kill = Process.Start("kill", ["-TERM", process.Id.ToString(CultureInfo.InvariantCulture)]))
        {
            await kill.WaitForExitAsync();
        }

        string rest = await process.StandardError.ReadToEndAsync();
        await process.WaitForExitAsync();
        Assert.Equal((143, "capturezone: error: stopped; nothing was written\n"), (process.ExitCode, rest));
        Assert.Equal(["a.toml", "p.csv"], _temp.Entries);
    }
}

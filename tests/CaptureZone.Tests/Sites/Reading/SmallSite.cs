using System.Diagnostics.CodeAnalysis;
using System.Text;
using CaptureZone.Sites;
using CaptureZone.Sites.Reading;

namespace CaptureZone.Tests.Sites.Reading;

/// <summary>A short site file without a mistake, and ways to read it.</summary>
internal static class SmallSite
{
    public const string Text = """
        format = 1
        title = "Small site"
        crs = "EPSG:26914"

        [aquifer]
        conductivity = "18 m/d"
        base = "212 m"
        top = "224 m"
        porosity = 0.24

        [regional_flow]
        gradient = 0.0031
        flows_toward = 112
        head = "238.6 m"
        head_at = [560400.0, 4642100.0]

        [[well]]
        name = "RW-1"
        at = [562300.0, 4641200.0]
        extracts = "1.4 L/s"
        radius = "0.15 m"
        purpose = "containment"

        [[well]]
        name = "RW-2"
        at = [562300.0, 4641300.0]
        extracts = "1.4 L/s"
        radius = "0.15 m"
        purpose = "other"

        [[plume]]
        name = "Cr"
        outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]
        retardation = 1.4

        [zones]
        travel_times = ["1 yr", "5 yr"]
        extent = [560000.0, 4640000.0, 563000.0, 4643000.0]

        [report]
        units = "metric"
        date = 2026-12-01

        [sources]
        "aquifer.conductivity" = "pumping test"

        [[backdrop]]
        name = "Road"
        line = [[562000.0, 4641000.0], [562500.0, 4641000.0]]

        """;

    public static SiteReading Read(string text, params (string Name, string Text)[] files) =>
        SiteReader.Read("site.toml", Encoding.UTF8.GetBytes(text), new MemoryFiles(files));

    /// <summary>The small site with one part of its text replaced; the part stands there exactly once.</summary>
    public static string With(string part, string replacement)
    {
        int at = Text.IndexOf(part, StringComparison.Ordinal);
        Assert.True(at >= 0 && at == Text.LastIndexOf(part, StringComparison.Ordinal), $"\"{part}\" must stand once in the small site");
        return Text.Replace(part, replacement, StringComparison.Ordinal);
    }

    /// <summary>Complaints without the file's name, as "line:column: severity: text".</summary>
    public static string[] Complaints(SiteReading reading) =>
        [.. reading.Complaints.Select(complaint => complaint.ToString()["site.toml:".Length..])];

    private sealed class MemoryFiles((string Name, string Text)[] files) : ISiteFiles
    {
        public bool TryRead(string name, [NotNullWhen(true)] out byte[]? bytes, [NotNullWhen(false)] out string? problem)
        {
            string? text = Array.Find(files, file => file.Name == name).Text;
            bytes = text is null ? null : Encoding.UTF8.GetBytes(text);
            problem = text is null ? "is not there" : null;
            return text is not null;
        }
    }
}

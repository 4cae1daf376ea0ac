using System.Numerics;
using System.Runtime.CompilerServices;
using System.Text;
using System.Text.RegularExpressions;
using CaptureZone.Elements.Wells;
using CaptureZone.Sites;
using CaptureZone.Sites.Reading;

namespace CaptureZone.Tests.Sites.Reading;

public sealed partial class ShippedSiteTests
{
    private static readonly string Root = Path.GetFullPath(Path.Combine(Folder(), "..", "..", "..", ".."));

    private static string Demo => Path.Combine(Root, "sites", "larkspur-plating-works.toml");

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void The_file_that_new_writes_reads_without_complaint(bool us) => AssertReads(NewSite.Text(us));

    [Fact]
    public void The_demo_site_reads_without_complaint()
    {
        SiteReading reading = SiteReader.Read("larkspur-plating-works.toml", File.ReadAllBytes(Demo), new DiskFiles(Path.GetDirectoryName(Demo)!));
        Assert.Empty(reading.Complaints);
        Model model = reading.Document!.Model;
        Assert.Equal(3, model.Wells.Count(well => well.Purpose == WellPurpose.Containment));
        Assert.Single(model.Wells, well => well.Rate < 0);
        Well supply = model.Wells.Single(well => well.Purpose == WellPurpose.Supply);
        Assert.InRange(Complex.Abs(supply.At - model.Wells[1].At), 900, 1100);
        Assert.InRange(reading.Document.Questions.Plumes.Single().Outline.Area, 60_000, 90_000);
    }

    /// <summary>Thiem drawdowns of all wells, superposed, at each screen (G. Thiem, Hydrologische Methoden, 1906, from memory).</summary>
    [Fact]
    public void The_demo_site_stays_confined_at_every_screen()
    {
        Model model = SiteReader.Read("demo", File.ReadAllBytes(Demo), new NoFiles()).Document!.Model;
        double transmissivity = model.Aquifer.Conductivity * model.Aquifer.Thickness;
        Complex toward = Complex.FromPolarCoordinates(model.Regional.Gradient, model.Regional.Direction);
        foreach (Well well in model.Wells)
        {
            Complex screen = well.At + well.Radius;
            Complex offset = screen - model.Regional.HeadAt;
            double head = model.Regional.Head - (toward.Real * offset.Real + toward.Imaginary * offset.Imaginary);
            foreach (Well other in model.Wells)
            {
                double ratio = Complex.Abs(screen - other.At) / Complex.Abs(model.Regional.HeadAt - other.At);
                head += other.Rate / (2 * Math.PI * transmissivity) * Math.Log(ratio);
            }

            Assert.True(head > model.Aquifer.Top, $"{well.Name}: {head}");
        }
    }

    [Fact]
    public void Every_key_stands_on_the_reference_page()
    {
        string page = File.ReadAllText(Path.Combine(Root, "docs", "site-file.md"));
        string[] absent = [.. SiteReader.Keys.Where(key => !page.Contains($"`{key}`", StringComparison.Ordinal))];
        Assert.Empty(absent);
    }

    [Fact]
    public void The_examples_of_the_reference_page_read_without_complaint()
    {
        string page = File.ReadAllText(Path.Combine(Root, "docs", "site-file.md"));
        string[] examples = [.. Example().Matches(page).Select(match => match.Groups[1].Value)];
        Assert.True(examples.Length >= 2);
        Assert.All(examples, AssertReads);
    }

    [Fact]
    public void Truncated_files_never_throw()
    {
        byte[] demo = File.ReadAllBytes(Demo);
        Random random = new(20261201);
        for (int i = 0; i < 60; i++)
        {
            byte[] part = demo[..random.Next(demo.Length)];
            AssertAnswers(part);
        }
    }

    [Fact]
    public void Files_with_flipped_bytes_never_throw()
    {
        byte[] demo = File.ReadAllBytes(Demo);
        Random random = new(7);
        for (int i = 0; i < 120; i++)
        {
            byte[] bytes = [.. demo];
            for (int flips = random.Next(1, 6); flips > 0; flips--)
            {
                bytes[random.Next(bytes.Length)] = (byte)random.Next(i % 2 == 0 ? 128 : 256);
            }

            AssertAnswers(bytes);
        }
    }

    private static void AssertAnswers(byte[] bytes)
    {
        SiteReading reading = SiteReader.Read("site.toml", bytes, new NoFiles());
        Assert.Equal(reading.Document is null, reading.Complaints.Any(complaint => complaint.Severity == Severity.Error));
        Assert.All(reading.Complaints, complaint => Assert.DoesNotContain('\n', complaint.ToString()));
    }

    private static void AssertReads(string text)
    {
        SiteReading reading = SiteReader.Read("site.toml", Encoding.UTF8.GetBytes(text), new NoFiles());
        Assert.Empty(reading.Complaints.Select(complaint => complaint.ToString()));
    }

    private static string Folder([CallerFilePath] string file = "") => Path.GetDirectoryName(file)!;

    [GeneratedRegex("```toml\n(.*?)```", RegexOptions.Singleline)]
    private static partial Regex Example();
}

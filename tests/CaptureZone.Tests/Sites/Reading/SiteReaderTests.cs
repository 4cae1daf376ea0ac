using System.Globalization;
using System.Numerics;
using System.Security.Cryptography;
using System.Text;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Wells;
using CaptureZone.Sites;
using CaptureZone.Sites.Reading;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Sites.Reading;

public sealed class SiteReaderTests
{
    /// <summary>Values that are read and not computed must come through to the last bit.</summary>
    private const double Exact = 0;

    [Fact]
    public void The_small_site_reads_with_exact_values()
    {
        SiteDocument site = Document(SmallSite.Text);
        Assert.Equal("Small site", site.Title);
        Assert.Equal(26914, site.Coordinates.Epsg);
        Assert.Equal(new Aquifer(18, 212, 224, 0.24), site.Model.Aquifer);
        Assert.Equal(0.0031, site.Model.Regional.Gradient, Exact);
        Assert.Equal((90 - 112) * Math.PI / 180, site.Model.Regional.Direction, Exact);
        Assert.Equal(238.6, site.Model.Regional.Head, Exact);
        Assert.Equal(["RW-1", "RW-2"], site.Model.Wells.Select(well => well.Name));
        Assert.Equal(1.4 * 86.4, site.Model.Wells[0].Rate, 1e-12);
        Assert.Equal(0.15, site.Model.Wells[0].Radius, Exact);
        Assert.Equal([WellPurpose.Containment, WellPurpose.Other], site.Model.Wells.Select(well => well.Purpose));
        Assert.Equal(1.4, site.Questions.Plumes.Single().Retardation, Exact);
        Assert.Equal(20_000, site.Questions.Plumes.Single().Outline.Area, 1e-6);
        Assert.Equal([365.25, 5 * 365.25], site.Questions.TravelTimes.AsEnumerable());
        Assert.Equal(["1 yr", "5 yr"], site.TravelTimeLabels.AsEnumerable());
        Assert.Equal(1, site.Questions.HeadUnit, Exact);
        Assert.Equal(new ReportSettings(ReportUnits.Metric, "", "", "", "2026-12-01", ""), site.Report);
        Assert.IsType<LineString>(site.Backdrops.Single().Shape);
        Assert.Empty(site.Warnings);
    }

    [Fact]
    public void Local_coordinates_count_from_the_centre_of_wells_plumes_and_known_head()
    {
        SiteDocument site = Document(SmallSite.Text);
        Complex[] anchors =
        [
            .. site.Model.Wells.Select(well => well.At),
            site.Model.Regional.HeadAt,
            new(site.Questions.Plumes[0].Outline.Centroid.X, site.Questions.Plumes[0].Outline.Centroid.Y),
        ];
        Complex middle = anchors.Aggregate(Complex.Zero, (sum, place) => sum + place) / anchors.Length;

        // The origin is rounded to whole units.
        Assert.True(Complex.Abs(middle) < 1, $"{middle}");
        Assert.Equal(562300, site.Frame.SiteX(site.Model.Wells[0].At), 1e-9);
        Assert.Equal(4641200, site.Frame.SiteY(site.Model.Wells[0].At), 1e-9);
        Assert.Equal(new Complex(0, 100), site.Model.Wells[1].At - site.Model.Wells[0].At);
    }

    [Fact]
    public void Feet_become_metres()
    {
        SiteDocument site = Document(NewSite.Text(us: true));
        Assert.Equal(160 * 0.3048, Complex.Abs(site.Model.Wells[1].At - site.Model.Wells[0].At), 1e-12);
        Assert.Equal(50 * 0.3048, site.Model.Aquifer.Conductivity, 1e-14);
        Assert.Equal(4 * 0.0254, site.Model.Wells[0].Radius, 1e-15);
        Assert.Equal(24 * 5.45099296896, site.Model.Wells[0].Rate, 1e-9);
        Assert.Equal(0.3048, site.Questions.HeadUnit, Exact);
        Assert.Equal(ReportUnits.Us, site.Report.Units);
    }

    [Fact]
    public void Conductivity_is_transmissivity_over_thickness()
    {
        SiteDocument site = Document(SmallSite.With("conductivity = \"18 m/d\"", "transmissivity = \"216 m2/d\"")
            .Replace("\"aquifer.conductivity\"", "\"aquifer.transmissivity\"", StringComparison.Ordinal));
        Assert.Equal(18, site.Model.Aquifer.Conductivity, 1e-14);
        Assert.Equal(QuantityKind.Transmissivity, site.Inputs[0].Quantity);
    }

    [Fact]
    public void An_injecting_well_has_a_negative_rate_and_needs_no_purpose()
    {
        SiteDocument site = Document(SmallSite.With(
            "extracts = \"1.4 L/s\"\nradius = \"0.15 m\"\npurpose = \"other\"", "injects = \"1 m3/d\"\nradius = \"0.15 m\""));
        Assert.Equal(-1, site.Model.Wells[1].Rate, Exact);
        Assert.Equal(WellPurpose.Other, site.Model.Wells[1].Purpose);
    }

    [Fact]
    public void A_site_may_have_no_wells_no_plumes_and_no_top()
    {
        SiteDocument site = Document("""
            format = 1
            title = "Heads only"
            crs = "local m"
            [aquifer]
            conductivity = "1e-4 m/s"
            base = "0 m"
            porosity = 0.3
            [regional_flow]
            gradient = 0
            head = "10 m"
            head_at = [0, 0]
            """);
        Assert.Empty(site.Model.Elements);
        Assert.Null(site.Model.Aquifer.Top);
        Assert.Equal(0, site.Model.Regional.Gradient, Exact);
        Assert.Equal(8.64, site.Model.Aquifer.Conductivity, 1e-14);
    }

    [Fact]
    public void Wells_at_one_place_are_legal()
    {
        SiteDocument site = Document(SmallSite.With("at = [562300.0, 4641300.0]", "at = [562300.0, 4641200.0]"));
        Assert.Equal(site.Model.Wells[0].At, site.Model.Wells[1].At);
    }

    [Fact]
    public void Travel_times_come_in_increasing_order_with_their_labels()
    {
        SiteDocument site = Document(SmallSite.With("\"1 yr\", \"5 yr\"", "\"5 yr\", \"30 d\", \"1 yr\""));
        Assert.Equal([30, 365.25, 1826.25], site.Questions.TravelTimes.AsEnumerable());
        Assert.Equal(["30 d", "1 yr", "5 yr"], site.TravelTimeLabels.AsEnumerable());
    }

    [Theory]
    [InlineData("[[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0], [561800.0, 4641300.0]]")]
    [InlineData("[[562200.0, 4641300.0], [562200.0, 4641200.0], [561800.0, 4641300.0]]")]
    public void An_outline_may_be_closed_or_open_and_run_either_way(string outline)
    {
        SiteDocument site = Document(SmallSite.With("[[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]", outline));
        Assert.Equal(20_000, site.Questions.Plumes.Single().Outline.Area, 1e-6);
        Assert.True(site.Questions.Plumes.Single().Outline.IsValid);
    }

    [Fact]
    public void Inputs_stand_in_the_order_of_the_file_with_their_sources_and_usual_ranges()
    {
        SiteDocument site = Document(SmallSite.Text);
        Assert.Equal(
            [
                "aquifer.conductivity", "aquifer.base", "aquifer.top", "aquifer.porosity",
                "regional_flow.gradient", "regional_flow.flows_toward", "regional_flow.head", "regional_flow.head_at",
                "well.RW-1.at", "well.RW-1.extracts", "well.RW-1.radius", "well.RW-2.at", "well.RW-2.extracts", "well.RW-2.radius",
                "plume.Cr.outline", "plume.Cr.retardation",
            ],
            site.Inputs.Select(input => input.Key));
        InputEntry conductivity = site.Inputs[0];
        Assert.Equal("Hydraulic conductivity", conductivity.Label);
        Assert.Equal("18 m/d", conductivity.Written);
        Assert.Equal(18, conductivity.Value, Exact);
        Assert.Equal("pumping test", conductivity.Source);
        Assert.Equal("0.00864 to 864 m/d (silty to clean sand; Freeze & Cherry 1979, Table 2.2, from memory)", conductivity.UsualRange);
        Assert.Equal("560400.0, 4642100.0", site.Inputs[7].Written);
        Assert.Equal("", site.Inputs[1].Source);
        Assert.Equal("3 corners", site.Inputs[14].Written);
        Assert.Equal(20_000, site.Inputs[14].Value, 1e-6);
    }

    [Fact]
    public void A_source_may_name_its_value_without_quotes()
    {
        SiteDocument site = Document(SmallSite.With("\"aquifer.conductivity\" = ", "aquifer.conductivity = "));
        Assert.Equal("pumping test", site.Inputs[0].Source);
    }

    [Fact]
    public void Warnings_do_not_keep_a_site_from_being_read()
    {
        SiteReading reading = SmallSite.Read(SmallSite.With("porosity = 0.24", "porosity = 0.6"));
        Assert.Equal(reading.Complaints.AsEnumerable(), reading.Document!.Warnings.AsEnumerable());
        Assert.Equal(Severity.Warning, reading.Complaints.Single().Severity);
    }

    [Fact]
    public void A_byte_order_mark_and_carriage_returns_change_nothing_but_the_fingerprint()
    {
        byte[] bytes = [.. Encoding.UTF8.GetPreamble(), .. Encoding.UTF8.GetBytes(SmallSite.Text.Replace("\n", "\r\n", StringComparison.Ordinal))];
        SiteReading reading = SiteReader.Read("site.toml", bytes, new NoFiles());
        Assert.Empty(reading.Complaints);
        SiteDocument plain = Document(SmallSite.Text);
        Assert.Equal(plain.Model.Aquifer, reading.Document!.Model.Aquifer);
        Assert.Equal(plain.Model.Elements.AsEnumerable(), reading.Document.Model.Elements);
        Assert.NotEqual(plain.Sha256, reading.Document.Sha256);
    }

    [Fact]
    public void Complaints_in_a_file_with_carriage_returns_have_the_same_places()
    {
        string broken = SmallSite.With("title = \"Small site\"", "title = Small site").Replace("0.24", "24", StringComparison.Ordinal);
        Assert.Equal(
            SmallSite.Complaints(SmallSite.Read(broken)),
            SmallSite.Complaints(SmallSite.Read(broken.Replace("\n", "\r\n", StringComparison.Ordinal))));
    }

    [Fact]
    public void A_byte_that_is_no_utf8_is_told_with_its_place()
    {
        byte[] bytes = [.. "format = 1\ntitle = \"Cr\u00e9ek "u8, 0xE9, .. "\"\n"u8];
        Complaint complaint = SiteReader.Read("site.toml", bytes, new NoFiles()).Complaints.Single();
        Assert.Equal("site.toml:2:16: error: the byte 0xe9 is no UTF-8; save the file as UTF-8", complaint.ToString());
    }

    [Fact]
    public void A_file_in_utf16_is_told_so()
    {
        byte[] bytes = [.. Encoding.Unicode.GetPreamble(), .. Encoding.Unicode.GetBytes(SmallSite.Text)];
        Complaint complaint = SiteReader.Read("site.toml", bytes, new NoFiles()).Complaints.Single();
        Assert.Equal("site.toml:1:1: error: the file is in UTF-16; save it as UTF-8", complaint.ToString());
    }

    [Fact]
    public void Columns_count_characters_not_bytes()
    {
        string text = SmallSite.With("title = \"Small site\"", "title = \"\u00e9\U0001D11E\" x");
        Assert.StartsWith("2:14: error:", SmallSite.Complaints(SmallSite.Read(text)).Single(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    [InlineData("ar-SA")]
    public void A_site_reads_the_same_in_every_culture(string culture)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            string broken = SmallSite.With("porosity = 0.24", "porosity = -24.5").Replace("\"18 m/d\"", "18.25", StringComparison.Ordinal);
            string[] complaints = SmallSite.Complaints(SmallSite.Read(broken));
            SiteDocument plain = Document(SmallSite.Text);
            CultureInfo.CurrentCulture = new CultureInfo(culture);
            SiteDocument there = Document(SmallSite.Text);
            Assert.Equal(plain.Inputs.AsEnumerable(), there.Inputs);
            Assert.Equal(plain.Model.Elements.AsEnumerable(), there.Model.Elements);
            Assert.Equal(complaints, SmallSite.Complaints(SmallSite.Read(broken)));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void The_fingerprint_covers_the_file_and_the_files_that_it_names()
    {
        string text = SmallSite.With("outline = [[561800.0, 4641300.0], [562200.0, 4641200.0], [562200.0, 4641300.0]]", "file = \"p.geojson\"")
            .Replace("EPSG:26914", "local m", StringComparison.Ordinal);
        const string Shape = """{"type":"Polygon","coordinates":[[[561800,4641300],[562200,4641200],[562200,4641300],[561800,4641300]]]}""";
        SiteReading reading = SmallSite.Read(text, ("p.geojson", Shape));
        Assert.Empty(reading.Complaints);
        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text + Shape))), reading.Document!.Sha256);
    }

    private static SiteDocument Document(string text)
    {
        SiteReading reading = SmallSite.Read(text);
        Assert.Empty(reading.Complaints.Select(complaint => complaint.ToString()));
        return reading.Document!;
    }
}

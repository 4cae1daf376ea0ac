using System.Globalization;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Gis;
using CaptureZone.Outputs.Results;
using CaptureZone.Sites;

namespace CaptureZone.Tests.Outputs;

public sealed class CultureTests
{
    [Theory]
    [InlineData("de-DE")]
    [InlineData("tr-TR")]
    public void Results_and_GIS_files_have_the_same_bytes_in_every_culture(string culture)
    {
        Dictionary<string, byte[]> here = Files(CultureInfo.GetCultureInfo(culture)), there = Files(CultureInfo.InvariantCulture);
        Assert.Equal(there.Keys.Order(), here.Keys.Order());
        Assert.All(there, file => Assert.True(file.Value.AsSpan().SequenceEqual(here[file.Key]), file.Key));
    }

    [Fact]
    public void The_cultures_of_this_test_differ_from_the_invariant_one()
    {
        Assert.Equal("1,5", 1.5.ToString(CultureInfo.GetCultureInfo("de-DE")));
        Assert.Equal("İ", CultureInfo.GetCultureInfo("tr-TR").TextInfo.ToUpper("i"));
    }

    private static Dictionary<string, byte[]> Files(CultureInfo culture)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = culture;
        try
        {
            Report report = SampleReport.Create(ReportUnits.Us);
            using TemporaryFolder folder = new();
            GeoJsonFiles.Write(report, folder.Path);
            GeoPackageFile.Write(report, folder["gis.gpkg"]);
            ShapefileFolder.Write(report, folder.Path);
            using (FileStream results = File.Create(folder["results.json"]))
            {
                ResultsJson.Write(report, results);
            }

            return Directory.EnumerateFiles(folder.Path).ToDictionary(path => Path.GetFileName(path), File.ReadAllBytes);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}

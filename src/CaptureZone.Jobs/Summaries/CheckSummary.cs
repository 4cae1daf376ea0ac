using CaptureZone.Outputs.Text;
using CaptureZone.Sites;
using CaptureZone.Sites.Coordinates;
using CaptureZone.Zones;

namespace CaptureZone.Jobs.Summaries;

/// <summary>The site as understood, in the report's units.</summary>
public static class CheckSummary
{
    /// <summary>Writes what was understood.</summary>
    /// <param name="site">The site.</param>
    /// <param name="to">Where to.</param>
    public static void Write(SiteDocument site, TextWriter to)
    {
        CoordinateSystem coordinates = site.Coordinates;
        to.WriteLine(site.Title);
        to.WriteLine();
        to.WriteLine("Inputs as understood");
        List<string[]> rows = [["crs", coordinates.Stated, $"{coordinates.Name}, in {coordinates.Unit}", ""]];
        rows.AddRange(site.Inputs.Select(input => InputRow(input, new Printer(site.Report.Units))));
        TextTable.Write(to, rows);
        WritePlumes(site, to);
        to.WriteLine();
        to.WriteLine($"The site can be run: capturezone run {site.FileName}");
    }

    private static string[] InputRow(InputEntry input, Printer print)
    {
        string understood = input.Quantity == QuantityKind.Place ? input.Written : print.Entered(input.Quantity, input.Value);
        return
        [
            input.Key,
            understood,
            understood == input.Written ? "" : $"written {input.Written}",
            input.Source.Length == 0 ? "source not given" : input.Source,
        ];
    }

    private static void WritePlumes(SiteDocument site, TextWriter to)
    {
        if (site.Questions.Plumes.IsEmpty)
        {
            return;
        }

        Printer print = new(site.Report.Units);
        to.WriteLine();
        to.WriteLine("Plumes");
        TextTable.Write(to, [.. site.Questions.Plumes.Select(plume => PlumeRow(plume, print))]);
    }

    private static string[] PlumeRow(Plume plume, Printer print) =>
        [plume.Name, print.Area(plume.Outline.Area), $"retardation {print.Ratio(plume.Retardation)}"];
}

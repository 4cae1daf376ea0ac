using CaptureZone.Outputs.Text;
using CaptureZone.Sites;

namespace CaptureZone.Jobs;

/// <summary>Turns a well that takes more than the aquifer yields into a complaint at its place in the site file.</summary>
internal static class Dewatering
{
    /// <summary>Computes something of a site.</summary>
    /// <typeparam name="T">What it gives.</typeparam>
    /// <param name="site">The site.</param>
    /// <param name="compute">Computes it.</param>
    /// <exception cref="InputRefusedException">A well takes more than the aquifer yields.</exception>
    public static T Refuse<T>(SiteDocument site, Func<T> compute)
    {
        try
        {
            return compute();
        }
        catch (DewateredException failure)
        {
            throw new InputRefusedException(
                [.. failure.Wells.Select(entry => Complaint(site, entry.Well, entry.LargestRate))]);
        }
    }

    /// <summary>Checks something of a site.</summary>
    /// <param name="site">The site.</param>
    /// <param name="check">Checks it.</param>
    /// <exception cref="InputRefusedException">A well takes more than the aquifer yields.</exception>
    public static void Refuse(SiteDocument site, Action check) =>
        Refuse(site, () =>
        {
            check();
            return true;
        });

    private static Complaint Complaint(SiteDocument site, int well, double largestRate)
    {
        Printer print = new(site.Report.Units);
        string name = site.Model.Wells[well].Name;
        string limit = largestRate > 0
            ? $"with the other wells held, the largest rate is {print.Rate(largestRate)}"
            : "with the other wells held, it yields nothing";
        (int line, int column) = WellPlaces.Of(site, well);
        return new Complaint(
            site.FileName,
            line,
            column,
            Severity.Error,
            $"well \"{name}\" takes {print.Rate(site.Model.Wells[well].Rate)}, more than the aquifer yields: the level at its screen "
            + $"would fall to the base; {limit}");
    }
}

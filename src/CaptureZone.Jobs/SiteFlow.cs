using CaptureZone.Flow;
using CaptureZone.Sites;

namespace CaptureZone.Jobs;

/// <summary>The flow of a site, for jobs that ask no more of it.</summary>
internal static class SiteFlow
{
    /// <summary>Solves the flow.</summary>
    /// <param name="site">The site.</param>
    /// <exception cref="InputRefusedException">A well takes more than the aquifer yields.</exception>
    public static FlowField Solve(SiteDocument site)
    {
        Dewatering.Refuse(site, () => SiteAnalysis.CheckYield(site.Model));
        return FlowSystem.Assemble(site.Model).Solve();
    }
}

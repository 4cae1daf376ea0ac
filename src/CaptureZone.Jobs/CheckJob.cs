using CaptureZone.Sites;

namespace CaptureZone.Jobs;

/// <summary>Reads a site and makes the checks that come before every calculation.</summary>
public static class CheckJob
{
    /// <summary>The site as understood.</summary>
    /// <param name="input">The site file.</param>
    /// <exception cref="InputRefusedException">Something is wrong with it, a dewatered well included.</exception>
    public static SiteDocument Check(SiteInput input)
    {
        SiteDocument site = input.Read();
        Dewatering.Refuse(site, () => SiteAnalysis.CheckYield(site.Model));
        return site;
    }
}

using CaptureZone.Sites;

namespace CaptureZone.Outputs.Gis;

/// <summary>From local metres to the site's own coordinates, for files that keep them.</summary>
internal static class SiteProjection
{
    /// <summary>Decimals of the site's coordinates: 1 mm, or a thousandth of a foot.</summary>
    public const int Decimals = 3;

    public static GridProjection Of(SiteDocument site, int srid) => new(
        (x, y) => (site.Frame.SiteX(new(x, y)), site.Frame.SiteY(new(x, y))), Decimals, srid);
}

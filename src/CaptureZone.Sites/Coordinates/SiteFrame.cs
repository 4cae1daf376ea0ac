using System.Numerics;

namespace CaptureZone.Sites.Coordinates;

/// <summary>
/// Between the site's coordinates (in their own unit) and the engine's local metres about an origin near the site's centroid, so
/// that large eastings and northings cost no digits.
/// </summary>
/// <param name="OriginX">Easting of the local origin, in the site's unit.</param>
/// <param name="OriginY">Northing of the local origin, in the site's unit.</param>
/// <param name="MetresPerUnit">Length of the site's unit, m.</param>
public sealed record SiteFrame(double OriginX, double OriginY, double MetresPerUnit)
{
    /// <summary>From the site's coordinates to local metres.</summary>
    /// <param name="x">Easting, in the site's unit.</param>
    /// <param name="y">Northing, in the site's unit.</param>
    public Complex ToLocal(double x, double y) => new((x - OriginX) * MetresPerUnit, (y - OriginY) * MetresPerUnit);

    /// <summary>Easting of a local point, in the site's unit.</summary>
    /// <param name="local">The point, m.</param>
    public double SiteX(Complex local) => OriginX + local.Real / MetresPerUnit;

    /// <summary>Northing of a local point, in the site's unit.</summary>
    /// <param name="local">The point, m.</param>
    public double SiteY(Complex local) => OriginY + local.Imaginary / MetresPerUnit;
}

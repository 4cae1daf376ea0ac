namespace CaptureZone.Sites.Coordinates;

/// <summary>Local coordinates: metres or feet from a mark of the site's own, with north upward.</summary>
public sealed record LocalSystem : CoordinateSystem
{
    /// <inheritdoc/>
    public override bool IsLocal => true;

    /// <inheritdoc/>
    public override (double Longitude, double Latitude) ToLonLat(double x, double y) =>
        throw new InvalidOperationException("local coordinates have no longitude and latitude");

    /// <summary>Local coordinates in a unit.</summary>
    /// <param name="stated">As the site file states it.</param>
    /// <param name="unit">Their unit.</param>
    internal static LocalSystem In(string stated, GridUnit unit) => new()
    {
        Stated = stated,
        Name = $"local coordinates, {unit.Symbol}",
        Unit = unit.Symbol,
        MetresPerUnit = unit.Metres,
        Epsg = null,
        Wkt = string.Empty,
        PrjText = string.Empty,
    };
}

namespace CaptureZone.Jobs.Points;

/// <summary>A place with a name, in the site's coordinates.</summary>
/// <param name="Name">Its name.</param>
/// <param name="X">Easting, in the site's unit.</param>
/// <param name="Y">Northing, in the site's unit.</param>
public sealed record NamedPoint(string Name, double X, double Y);

using System.Collections.Immutable;
using CaptureZone.Sites.Units;

namespace CaptureZone.Sites.Coordinates;

/// <summary>A unit of plane coordinates.</summary>
/// <param name="Symbol">As it is printed; its length stands in the table of units.</param>
/// <param name="WktName">Its name in well-known text.</param>
/// <param name="EsriName">Its name in .prj files.</param>
/// <param name="Epsg">EPSG code.</param>
public sealed record GridUnit(string Symbol, string WktName, string EsriName, int Epsg)
{
    /// <summary>
    /// How far a definition's length of its unit may be off, as a share: definitions print 12 to 17 digits, and the two feet differ
    /// by 2e-6.
    /// </summary>
    private const double LengthTolerance = 1e-9;

    /// <summary>The metre.</summary>
    public static GridUnit Metre { get; } = new("m", "metre", "Meter", 9001);

    /// <summary>The international foot.</summary>
    public static GridUnit Foot { get; } = new("ft", "foot", "Foot", 9002);

    /// <summary>The US survey foot.</summary>
    public static GridUnit SurveyFoot { get; } = new("ftUS", "US survey foot", "Foot_US", 9003);

    /// <summary>The units that coordinates may have.</summary>
    public static ImmutableArray<GridUnit> Known { get; } = [Metre, Foot, SurveyFoot];

    /// <summary>Its length, m.</summary>
    public double Metres { get; } = UnitTable.Named(Symbol).Factor;

    /// <summary>The unit of a length; null when there is none.</summary>
    /// <param name="metres">The length, m.</param>
    public static GridUnit? OfLength(double metres) =>
        Known.FirstOrDefault(unit => Math.Abs(metres / unit.Metres - 1) < LengthTolerance);
}

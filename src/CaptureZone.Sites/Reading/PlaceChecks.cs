using CaptureZone.Sites.Coordinates;
using NetTopologySuite.Geometries;

namespace CaptureZone.Sites.Reading;

/// <summary>Checks that all places of a file can be places of one site.</summary>
internal static class PlaceChecks
{
    /// <summary>Places farther than this from the others are no part of a site that one aquifer describes, m.</summary>
    private const double FarthestPlace = 100_000;

    /// <summary>Complains of longitude and latitude, and warns of what lies far from the rest.</summary>
    /// <param name="site">What all readers share.</param>
    public static void Check(SiteContext site)
    {
        if (site.Coordinates is not { } system || site.Places.Count == 0)
        {
            return;
        }

        // One is enough: all places of a file are given in the same way.
        foreach ((Coordinate at, int offset) in Each(site))
        {
            if (system.ProblemWith(at.X, at.Y) is { } problem)
            {
                site.Complaints.Error(offset, problem);
                return;
            }
        }

        WarnOfFar(site, FarthestPlace / system.MetresPerUnit);
    }

    /// <summary>Which zone fits, in words that end a complaint; empty where the places are no longitude and latitude.</summary>
    /// <param name="site">What all readers share.</param>
    public static string ZoneHint(SiteContext site)
    {
        (Coordinate at, int _) = Each(site).FirstOrDefault(place => Math.Abs(place.At.X) <= 180 && Math.Abs(place.At.Y) <= 90);
        return at is not null && CoordinateSystems.UtmSuggestion(at.X, at.Y) is { } zone
            ? $"; for {Words.Place(at.X, at.Y)} that is {zone}"
            : "";
    }

    private static IEnumerable<(Coordinate At, int Offset)> Each(SiteContext site) =>
        site.Places
            .SelectMany(places => places.Points.Select((point, index) => (At: point, Offset: places.OffsetOf(index))))
            .OrderBy(place => place.Offset);

    /// <summary>One warning for each value that holds a place far from the value that has most others near it.</summary>
    private static void WarnOfFar(SiteContext site, double farthest)
    {
        Coordinate middle = site.Places
            .Select(places => places.Points[0])
            .MaxBy(point => site.Places.Count(other => other.Points[0].Distance(point) <= farthest))!;
        foreach (WrittenPlaces places in site.Places)
        {
            int index = places.Points.ToList().FindIndex(point => point.Distance(middle) > farthest);
            if (index >= 0)
            {
                Coordinate far = places.Points[index];
                site.Complaints.Warn(
                    places.OffsetOf(index),
                    $"{Words.Place(far.X, far.Y)} lies more than 100 km from the rest of the site; "
                    + "are x and y swapped, or is a digit missing?");
            }
        }
    }
}

using System.Collections.Immutable;
using NetTopologySuite.Geometries;
using Dimension = CaptureZone.Sites.Units.Dimension;

namespace CaptureZone.Sites.Reading.Sections;

/// <summary>What zones are asked for.</summary>
/// <param name="TravelTimes">Travel times, increasing.</param>
/// <param name="Extent">The frame, in the site's coordinates; null when it is left to the program.</param>
internal sealed record ZonesDraft(ImmutableArray<WrittenQuantity> TravelTimes, Envelope? Extent);

/// <summary>Reads [zones].</summary>
internal static class ZonesSection
{
    /// <summary>More zones than this cannot be told apart on a map.</summary>
    private const int MostTravelTimes = 12;

    private static readonly Field TravelTimes = new("travel_times", "", "5 yr") { Limit = Limit.Positive, Usual = UsualRange.TravelTime };
    private static readonly Field Extent = new("extent", "", "[xmin, ymin, xmax, ymax]");

    /// <summary>What is asked.</summary>
    /// <param name="table">The table.</param>
    public static ZonesDraft Read(TableReader table)
    {
        ImmutableArray<WrittenQuantity> times = table.Quantities(TravelTimes, Dimension.Time);
        Envelope? extent = table.Frame(Extent);
        table.Finish();
        if (times.Length > MostTravelTimes)
        {
            table.Error(
                TravelTimes.Key,
                $"travel_times has {Words.Number(times.Length)} times; at most {Words.Number(MostTravelTimes)} can be told apart on a map");
        }

        for (int i = 1; i < times.Length; i++)
        {
            if (times[..i].FirstOrDefault(earlier => earlier.Value == times[i].Value) is { } same)
            {
                table.Site.Complaints.Error(
                    times[i].Offset,
                    $"{Words.Quote(times[i].Written)} is the same time as {Words.Quote(same.Written)}; leave one of the two out");
            }
        }

        return new ZonesDraft([.. times.OrderBy(time => time.Value)], extent);
    }
}

using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Topology;

namespace CaptureZone.Zones.TravelTimes;

/// <summary>One streamline into a well, with the places from which water needs each of the times asked.</summary>
/// <param name="Angle">Where it enters the screen, radians counter-clockwise from east.</param>
/// <param name="Anchor">A place on it, m, from which the rest was followed.</param>
/// <param name="AnchorTime">Travel time from there to the well, d.</param>
/// <param name="Side">The dividing branch that it is; null for any other streamline.</param>
/// <param name="Fronts">For each time, where the water is that needs it; the origin where the streamline is shorter.</param>
/// <param name="Age">Travel time from the streamline's origin, d; infinite when it comes from far or from a stagnation point.</param>
/// <param name="Course">Its vertices with the travel time from each to the well, from the well outward.</param>
internal sealed record Ray(
    double Angle,
    Complex Anchor,
    double AnchorTime,
    DividingBranch? Side,
    ImmutableArray<Complex> Fronts,
    double Age,
    ImmutableArray<PathPoint> Course)
{
    /// <summary>Its place at a travel time, between vertices; good enough to tell how far neighbours are apart.</summary>
    /// <param name="time">Travel time to the well, d.</param>
    internal Complex At(double time)
    {
        int low = 0, high = Course.Length - 1;
        if (time >= Course[high].Time)
        {
            return Course[high].At;
        }

        if (time <= Course[low].Time)
        {
            return Course[low].At;
        }

        while (high - low > 1)
        {
            int middle = (low + high) / 2;
            (low, high) = Course[middle].Time <= time ? (middle, high) : (low, middle);
        }

        PathPoint a = Course[low], b = Course[high];
        return double.IsInfinity(b.Time) ? a.At : a.At + (b.At - a.At) * ((time - a.Time) / (b.Time - a.Time));
    }
}

using System.Collections;
using System.Numerics;
using System.Reflection;
using CaptureZone.Flow;
using NetTopologySuite.Geometries;

namespace CaptureZone.Tests.Zones;

/// <summary>Every number in the answers of a run, with the way to it.</summary>
public static class Figures
{
    /// <summary>The numbers, in one order.</summary>
    public static IEnumerable<(string Way, double Value)> Of(SiteAnswers answers) => Of(answers, "answers");

    private static IEnumerable<(string Way, double Value)> Of(object? value, string way) => value switch
    {
        null or string or FlowField or Questions => [],
        double number => [(way, number)],
        IConvertible other => [(way, other.ToDouble(System.Globalization.CultureInfo.InvariantCulture))],
        Complex place => [(way + ".x", place.Real), (way + ".y", place.Imaginary)],
        Coordinate place => [(way + ".x", place.X), (way + ".y", place.Y)],
        Envelope box => [(way, box.MinX), (way, box.MaxX), (way, box.MinY), (way, box.MaxY)],
        Geometry shape => shape.Coordinates.SelectMany(corner => Of(corner, way)),
        IEnumerable items => items.Cast<object?>().SelectMany(item => Of(item, way)),
        _ => value.GetType().GetProperties(BindingFlags.Public | BindingFlags.Instance)
            .SelectMany(property => Of(property.GetValue(value), way + "." + property.Name)),
    };
}

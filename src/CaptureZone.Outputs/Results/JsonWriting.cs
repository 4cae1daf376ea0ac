using System.Collections.Immutable;
using System.Numerics;
using System.Text.Json;
using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Outputs.Results;

/// <summary>What JSON results have in common: rounded numbers, null for none, places in the site's coordinates, lists of objects.</summary>
public static class JsonWriting
{
    /// <summary>Writes a member that is a number to ten significant digits; null for none and for one that is not finite.</summary>
    /// <param name="json">The writer.</param>
    /// <param name="name">The member's name.</param>
    /// <param name="value">The number.</param>
    public static void WriteValue(this Utf8JsonWriter json, string name, double? value)
    {
        json.WritePropertyName(name);
        json.WriteValue(value);
    }

    /// <summary>Writes a number to ten significant digits; null for none and for one that is not finite.</summary>
    /// <param name="json">The writer.</param>
    /// <param name="value">The number.</param>
    public static void WriteValue(this Utf8JsonWriter json, double? value)
    {
        if (Rounding.TenFigures(value) is { } number)
        {
            json.WriteNumberValue(number);
        }
        else
        {
            json.WriteNullValue();
        }
    }

    /// <summary>Writes members x and y: a place in the site's coordinates.</summary>
    /// <param name="json">The writer.</param>
    /// <param name="frame">From local metres to the site's coordinates.</param>
    /// <param name="at">The place, local m.</param>
    public static void WritePlace(this Utf8JsonWriter json, SiteFrame frame, Complex at)
    {
        json.WriteValue("x", frame.SiteX(at));
        json.WriteValue("y", frame.SiteY(at));
    }

    /// <summary>Writes a member that is a list of objects.</summary>
    /// <typeparam name="T">What one object is written from.</typeparam>
    /// <param name="json">The writer.</param>
    /// <param name="name">The member's name.</param>
    /// <param name="items">What the objects are written from.</param>
    /// <param name="write">Writes the members of one.</param>
    public static void WriteObjects<T>(this Utf8JsonWriter json, string name, ImmutableArray<T> items, Action<T> write)
    {
        json.WriteStartArray(name);
        foreach (T item in items)
        {
            json.WriteStartObject();
            write(item);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}

using System.Collections.Immutable;

namespace CaptureZone.Sites.Coordinates;

/// <summary>What a projected coordinate system is made of.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Datum">Its datum.</param>
/// <param name="Method">Its projection.</param>
/// <param name="Values">Values of the projection's parameters, in the projection's order: degrees, a ratio, or the system's unit.</param>
/// <param name="Unit">Unit of eastings and northings.</param>
public sealed record ProjectedDefinition(
    string Name, Datum Datum, ProjectionMethod Method, ImmutableArray<double> Values, GridUnit Unit)
{
    /// <summary>Value of a parameter.</summary>
    /// <param name="wktName">Its name in well-known text.</param>
    public double this[string wktName] =>
        Values[Method.Parameters.IndexOf(Method.Parameters.Single(parameter => parameter.WktName == wktName))];

    /// <summary>Whether two definitions give every place the same coordinates, whatever they are called.</summary>
    /// <param name="other">The other.</param>
    public bool SameSystem(ProjectedDefinition other) =>
        Datum == other.Datum && Method == other.Method && Unit == other.Unit && Values.AsSpan().SequenceEqual(other.Values.AsSpan());
}

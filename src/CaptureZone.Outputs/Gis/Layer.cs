using System.Collections.Immutable;
using NetTopologySuite.Geometries;

namespace CaptureZone.Outputs.Gis;

/// <summary>What a layer's shapes are.</summary>
public enum ShapeKind
{
    /// <summary>One point each.</summary>
    Point,

    /// <summary>Lines, one part or several.</summary>
    Line,

    /// <summary>Polygons, one part or several.</summary>
    Polygon,
}

/// <summary>What a column holds.</summary>
public enum ColumnKind
{
    /// <summary>Text.</summary>
    Text,

    /// <summary>A number; ten significant digits.</summary>
    Number,

    /// <summary>A whole number.</summary>
    Whole,

    /// <summary>Yes or no.</summary>
    Flag,
}

/// <summary>One attribute of a layer.</summary>
/// <param name="Name">Its name, with the unit at its end.</param>
/// <param name="Kind">What it holds.</param>
/// <param name="Short">Its name in Shapefiles: at most 10 characters.</param>
public sealed record Column(string Name, ColumnKind Kind, string Short)
{
    /// <summary>A column whose name is short enough for Shapefiles.</summary>
    /// <param name="name">Its name, with the unit at its end.</param>
    /// <param name="kind">What it holds.</param>
    public Column(string name, ColumnKind kind)
        : this(name, kind, name)
    {
    }
}

/// <summary>
/// A layer of a map, defined once for every GIS format. Shapes are in local metres; the writers bring them into their coordinates.
/// </summary>
/// <param name="Name">Its name, and that of its file.</param>
/// <param name="Shape">What its shapes are.</param>
/// <param name="Columns">Its attributes.</param>
/// <param name="Features">Its features, in a fixed order.</param>
public sealed record Layer(string Name, ShapeKind Shape, ImmutableArray<Column> Columns, ImmutableArray<Feature> Features);

/// <summary>One feature of a layer.</summary>
/// <param name="Shape">Its shape, local m.</param>
/// <param name="Cells">One value per column.</param>
public sealed record Feature(Geometry Shape, ImmutableArray<Cell> Cells);

using System.Numerics;
using CaptureZone.Elements.Wells;
using NetTopologySuite.Geometries;

namespace CaptureZone.Flow;

/// <summary>Heads at the nodes of a grid of square-like cells over a frame; NaN where the aquifer is dry.</summary>
internal sealed class HeadGrid
{
    /// <summary>Cells in all: 160 x 120 of a frame of four to three, a few millimetres each on a printed page.</summary>
    private const double Cells = 160 * 120;

    /// <summary>Cells at least along the shorter side.</summary>
    private const int LeastCells = 8;

    private readonly double[] _heads;

    private HeadGrid(Envelope extent)
    {
        Extent = extent;
        double cell = Math.Sqrt(extent.Width * extent.Height / Cells);
        Columns = Math.Max(LeastCells, (int)Math.Ceiling(extent.Width / cell));
        Rows = Math.Max(LeastCells, (int)Math.Ceiling(extent.Height / cell));
        _heads = new double[(Columns + 1) * (Rows + 1)];
    }

    /// <summary>The frame, m.</summary>
    public Envelope Extent { get; }

    /// <summary>Cells from west to east.</summary>
    public int Columns { get; }

    /// <summary>Cells from south to north.</summary>
    public int Rows { get; }

    /// <summary>Length of a cell's longer side, m.</summary>
    public double CellSize => Math.Max(Extent.Width / Columns, Extent.Height / Rows);

    /// <summary>Evaluates a field over a frame. Inside a screen stands the head at its rim.</summary>
    /// <param name="field">The flow.</param>
    /// <param name="extent">The frame, m; not empty.</param>
    public static HeadGrid Over(FlowField field, Envelope extent)
    {
        HeadGrid grid = new(extent);
        double[] x = new double[grid._heads.Length], y = new double[grid._heads.Length];
        for (int row = 0, i = 0; row <= grid.Rows; row++)
        {
            for (int column = 0; column <= grid.Columns; column++, i++)
            {
                Complex node = grid.Node(column, row);
                (x[i], y[i]) = (node.Real, node.Imaginary);
            }
        }

        foreach (Well well in field.System.Wells)
        {
            grid.MoveToRim(well, x, y);
        }

        field.HeadsAt(new Points(x, y), grid._heads);
        return grid;
    }

    /// <summary>Place of a node, m.</summary>
    public Complex Node(int column, int row) => new(
        Extent.MinX + Extent.Width * column / Columns, Extent.MinY + Extent.Height * row / Rows);

    /// <summary>Head at a node, m elevation.</summary>
    public double Head(int column, int row) => _heads[row * (Columns + 1) + column];

    /// <summary>All heads that are there, from low to high, m elevation.</summary>
    public double[] SortedHeads()
    {
        double[] heads = [.. _heads.Where(double.IsFinite)];
        Array.Sort(heads);
        return heads;
    }

    private void MoveToRim(Well well, double[] x, double[] y)
    {
        int First(double from, double to, double at, int cells) =>
            (int)Math.Clamp(Math.Ceiling((at - well.Radius - from) / (to - from) * cells), 0, cells + 1);
        int Last(double from, double to, double at, int cells) =>
            (int)Math.Clamp(Math.Floor((at + well.Radius - from) / (to - from) * cells), -1, cells);
        int west = First(Extent.MinX, Extent.MaxX, well.At.Real, Columns), east = Last(Extent.MinX, Extent.MaxX, well.At.Real, Columns);
        int south = First(Extent.MinY, Extent.MaxY, well.At.Imaginary, Rows), north = Last(Extent.MinY, Extent.MaxY, well.At.Imaginary, Rows);
        for (int row = south; row <= north; row++)
        {
            for (int column = west; column <= east; column++)
            {
                Complex node = Node(column, row), from = node - well.At;
                if (from.Magnitude < well.Radius)
                {
                    Complex rim = well.At + Complex.FromPolarCoordinates(well.Radius, from.Phase);
                    int i = row * (Columns + 1) + column;
                    (x[i], y[i]) = (rim.Real, rim.Imaginary);
                }
            }
        }
    }
}

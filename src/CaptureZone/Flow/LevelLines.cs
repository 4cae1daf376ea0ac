using System.Collections.Immutable;
using System.Numerics;

namespace CaptureZone.Flow;

/// <summary>
/// Lines of one head over a grid, by marching squares: a line enters and leaves each cell through edges whose ends lie on different
/// sides of the head; of the two ways through a saddle cell its centre decides. A dry place counts as below every head: heads fall to
/// the base at its edge, so that no line enters it.
/// </summary>
/// <param name="field">The flow.</param>
/// <param name="grid">Its heads.</param>
internal sealed class LevelLines(FlowField field, HeadGrid grid)
{
    /// <summary>How far a line may bulge from its chord, of a cell: unseen on a page.</summary>
    private const double Bulge = 0.01;

    /// <summary>How often a chord is halved at most.</summary>
    private const int Halvings = 6;

    private const int None = -1;

    private readonly EdgeChains _chains = new(grid.Columns * (grid.Rows + 1) + (grid.Columns + 1) * grid.Rows);

    /// <summary>The lines of a head, m; a closed one ends at the place where it begins.</summary>
    /// <param name="level">The head, m elevation.</param>
    public ImmutableArray<ImmutableArray<Complex>> At(double level)
    {
        LevelLine line = new(field, level);
        _chains.Clear();
        for (int row = 0; row < grid.Rows; row++)
        {
            for (int column = 0; column < grid.Columns; column++)
            {
                LinkThrough(column, row, level);
            }
        }

        return
        [
            .. _chains.All()
                .Select(chain => Smooth(line, [.. chain.Select(edge => Vertex(line, level, edge))]))
                .Where(vertices => vertices.Length > 1),
        ];
    }

    private void LinkThrough(int column, int row, double level)
    {
        double southWest = grid.Head(column, row), southEast = grid.Head(column + 1, row);
        double northWest = grid.Head(column, row + 1), northEast = grid.Head(column + 1, row + 1);
        bool sw = southWest > level, se = southEast > level, nw = northWest > level, ne = northEast > level;
        int south = sw != se ? Eastward(column, row) : None, north = nw != ne ? Eastward(column, row + 1) : None;
        int west = sw != nw ? Northward(column, row) : None, east = se != ne ? Northward(column + 1, row) : None;
        if (south >= 0 && north >= 0 && west >= 0 && east >= 0)
        {
            bool cutsSouthEast = field.HeadAt((grid.Node(column, row) + grid.Node(column + 1, row + 1)) / 2) > level == sw;
            _chains.Link(south, cutsSouthEast ? east : west);
            _chains.Link(north, cutsSouthEast ? west : east);
        }
        else if (Math.Max(Math.Max(south, north), Math.Max(west, east)) is int one and not None)
        {
            int other = south + north + west + east - one - 2 * None;
            _chains.Link(one, other);
        }
    }

    private int Eastward(int column, int row) => row * grid.Columns + column;

    private int Northward(int column, int row) => grid.Columns * (grid.Rows + 1) + row * (grid.Columns + 1) + column;

    private Complex Vertex(LevelLine line, double level, int edge)
    {
        int eastward = grid.Columns * (grid.Rows + 1);
        bool isEastward = edge < eastward;
        int width = isEastward ? grid.Columns : grid.Columns + 1, index = isEastward ? edge : edge - eastward;
        int column = index % width, row = index / width;
        int endColumn = isEastward ? column + 1 : column, endRow = isEastward ? row : row + 1;
        double start = grid.Head(column, row), end = grid.Head(endColumn, endRow);
        double share = double.IsNaN(start + end) ? 0.5 : (level - start) / (end - start);
        return start > level
            ? line.Between(grid.Node(endColumn, endRow), grid.Node(column, row), 1 - share)
            : line.Between(grid.Node(column, row), grid.Node(endColumn, endRow), share);
    }

    /// <summary>Puts more vertices where the line bends; leaves out those that repeat.</summary>
    private ImmutableArray<Complex> Smooth(LevelLine line, List<Complex> vertices)
    {
        ImmutableArray<Complex>.Builder smooth = ImmutableArray.CreateBuilder<Complex>(vertices.Count);
        smooth.Add(vertices[0]);
        for (int i = 1; i < vertices.Count; i++)
        {
            Halve(line, vertices[i - 1], vertices[i], Halvings, smooth);
        }

        return smooth.ToImmutable();
    }

    private void Halve(LevelLine line, Complex a, Complex b, int left, ImmutableArray<Complex>.Builder into)
    {
        Complex middle = (a + b) / 2;
        double length = (b - a).Magnitude;
        if (left > 0
            && length > Bulge * grid.CellSize
            && line.From(middle, length / 2) is Complex on
            && (on - middle).Magnitude > Bulge * grid.CellSize
            && grid.Extent.Contains(on.Real, on.Imaginary))
        {
            Halve(line, a, on, left - 1, into);
            Halve(line, on, b, left - 1, into);
        }
        else if (a != b)
        {
            into.Add(b);
        }
    }
}

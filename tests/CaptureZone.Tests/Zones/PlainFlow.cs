using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Wells;

namespace CaptureZone.Tests.Zones;

/// <summary>
/// Wells in uniform flow written down anew, with nothing of the engine's: W = W0 - sum (q / 2 pi) / (z - zw), the classical
/// Runge-Kutta method of order 4 (W. Kutta 1901, any textbook) with steps a fixed share of |W / W'|, which is the distance to a
/// well as well as to a stagnation point, and ends that are proven from bounds on the flow instead of screens and circles.
/// </summary>
public sealed class PlainFlow
{
    /// <summary>No well: the water leaves the site, or was not followed to an end.</summary>
    public const int None = -1;

    private const double StepShare = 0.12;
    private const double LongestStepShare = 0.2;
    private const double TrapMargin = 1.2;
    private const int MostSteps = 200_000;

    private readonly double[] _x, _y, _strength, _trap;
    private readonly int[] _well;
    private readonly double _ux, _uy, _centreX, _centreY, _radius, _away, _waterColumn;

    /// <summary>Writes down the flow of a model.</summary>
    public PlainFlow(Model model)
    {
        Well[] wells = [.. model.Wells];
        int[] first = [.. Enumerable.Range(0, wells.Length).Where(i => wells[..i].All(other => other.At != wells[i].At))];
        double[] rates = [.. first.Select(i => wells.Where(other => other.At == wells[i].At).Sum(other => other.Rate))];
        int[] running = [.. Enumerable.Range(0, first.Length).Where(k => rates[k] != 0)];
        _well = [.. running.Select(k => first[k])];
        _x = [.. _well.Select(i => wells[i].At.Real)];
        _y = [.. _well.Select(i => wells[i].At.Imaginary)];
        _strength = [.. running.Select(k => rates[k] / (2 * Math.PI))];
        Aquifer aquifer = model.Aquifer;
        double column = Math.Min(model.Regional.Head - aquifer.Base, aquifer.Top - aquifer.Base ?? double.PositiveInfinity);
        double uniform = aquifer.Conductivity * column * model.Regional.Gradient;
        (_ux, _uy) = (uniform * Math.Cos(model.Regional.Direction), uniform * Math.Sin(model.Regional.Direction));
        _waterColumn = aquifer.Porosity * column;
        (_centreX, _centreY) = (_x.DefaultIfEmpty(0).Average(), _y.DefaultIfEmpty(0).Average());
        _radius = _x.Zip(_y, (x, y) => Math.Sqrt(Square(x - _centreX) + Square(y - _centreY))).DefaultIfEmpty(0).Max();
        _away = AwayFrom(uniform);
        _trap = [.. Enumerable.Range(0, _x.Length).Select(Trap)];
    }

    /// <summary>The well in which water from a place ends (the first of those at one place); <see cref="None"/> when it leaves.</summary>
    public int Destination(Complex from) => Follow(from, double.PositiveInfinity, 0, out _);

    /// <summary>
    /// Days until water from a place reaches a well's axis (the time within its screen is nothing); infinite when it goes elsewhere or
    /// needs more than the limit. For confined flow.
    /// </summary>
    public double TimeTo(int well, Complex from, double limit, double screen) =>
        Follow(from, limit, screen, out double time) == well ? time : double.PositiveInfinity;

    /// <summary>Norm of the discharge vector, m2/d.</summary>
    public double SpeedAt(Complex at)
    {
        Flow(at.Real, at.Imaginary, out double qx, out double qy);
        return Math.Sqrt(qx * qx + qy * qy);
    }

    private int Follow(Complex from, double limit, double screen, out double time)
    {
        double x = from.Real, y = from.Imaginary;
        time = 0;
        for (int i = 0; i < MostSteps; i++)
        {
            if (EndAt(x, y, screen) is { } end)
            {
                return end;
            }

            double step = StepAt(x, y);
            Slope(x, y, out double ax, out double ay, out double at);
            Slope(x + step / 2 * ax, y + step / 2 * ay, out double bx, out double by, out double bt);
            Slope(x + step / 2 * bx, y + step / 2 * by, out double cx, out double cy, out double ct);
            Slope(x + step * cx, y + step * cy, out double dx, out double dy, out double dt);
            x += step / 6 * (ax + 2 * bx + 2 * cx + dx);
            y += step / 6 * (ay + 2 * by + 2 * cy + dy);
            time += step / 6 * (at + 2 * bt + 2 * ct + dt);
            if (time > limit)
            {
                return None;
            }
        }

        return None;
    }

    private int? EndAt(double x, double y, double screen)
    {
        for (int j = 0; j < _x.Length; j++)
        {
            double end = screen > 0 ? screen : _trap[j];
            if (_strength[j] > 0 && Square(x - _x[j]) + Square(y - _y[j]) <= end * end)
            {
                return _well[j];
            }
        }

        return IsAway(x - _centreX, y - _centreY) ? None : null;
    }

    /// <summary>With regional flow: behind the wells, where everything moves on; without it: outside, where everything moves outward.</summary>
    private bool IsAway(double x, double y)
    {
        double uniform = Math.Sqrt(_ux * _ux + _uy * _uy);
        return uniform > 0 ? (x * _ux + y * _uy) / uniform > _away : x * x + y * y > _away * _away;
    }

    private double AwayFrom(double uniform)
    {
        double total = _strength.Sum(Math.Abs), net = _strength.Sum();
        return uniform > 0 ? _radius + total / (0.9 * uniform)
            : net < 0 ? _radius + total * _radius / (0.9 * -net) : double.PositiveInfinity;
    }

    /// <summary>A radius within which all water moves toward a well: its own flow s / r is above what all else can make there.</summary>
    private double Trap(int j)
    {
        if (_strength[j] < 0)
        {
            return 0;
        }

        double trap = Enumerable.Range(0, _x.Length).Where(k => k != j).Select(k => Between(j, k)).DefaultIfEmpty(1e6).Min() / 2;
        while (_strength[j] / trap < TrapMargin * Others(j, trap))
        {
            trap /= TrapMargin;
        }

        return trap;
    }

    private double Others(int j, double within)
    {
        double sum = Math.Sqrt(_ux * _ux + _uy * _uy);
        for (int k = 0; k < _x.Length; k++)
        {
            sum += k == j ? 0 : Math.Abs(_strength[k]) / (Between(j, k) - within);
        }

        return sum;
    }

    private double Between(int j, int k) => Math.Sqrt(Square(_x[j] - _x[k]) + Square(_y[j] - _y[k]));

    private double StepAt(double x, double y)
    {
        double qx = _ux, qy = _uy, re = 0, im = 0, nearest = double.PositiveInfinity;
        for (int j = 0; j < _x.Length; j++)
        {
            double dx = x - _x[j], dy = y - _y[j], square = dx * dx + dy * dy, part = _strength[j] / square;
            nearest = Math.Min(nearest, square);
            qx -= part * dx;
            qy -= part * dy;
            re += part / square * (dx * dx - dy * dy);
            im += part / square * (-2 * dx * dy);
        }

        double bend = Math.Sqrt((qx * qx + qy * qy) / (re * re + im * im));
        return Math.Min(StepShare * bend, LongestStepShare * Math.Sqrt(nearest));
    }

    private void Slope(double x, double y, out double dx, out double dy, out double slowness)
    {
        Flow(x, y, out double qx, out double qy);
        double inverse = 1 / Math.Sqrt(qx * qx + qy * qy);
        (dx, dy, slowness) = (qx * inverse, qy * inverse, _waterColumn * inverse);
    }

    private void Flow(double x, double y, out double qx, out double qy)
    {
        (qx, qy) = (_ux, _uy);
        for (int j = 0; j < _x.Length; j++)
        {
            double dx = x - _x[j], dy = y - _y[j], part = _strength[j] / (dx * dx + dy * dy);
            qx -= part * dx;
            qy -= part * dy;
        }
    }

    private static double Square(double value) => value * value;
}

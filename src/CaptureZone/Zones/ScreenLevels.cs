using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;

namespace CaptureZone.Zones;

/// <summary>Water levels at the screens, with the wells of the model on and off; throws where the aquifer cannot yield the rates.</summary>
public sealed class ScreenLevels
{
    /// <summary>Points round a screen over which the potential is averaged.</summary>
    private const int RingPoints = 16;

    private readonly FlowField _on;
    private readonly FlowField _off;

    private ScreenLevels(FlowField on, FlowField off)
    {
        _on = on;
        _off = off;
    }

    /// <summary>The same flow with every well off, under the same known head.</summary>
    public FlowField WellsOff => _off;

    /// <summary>Checks the levels of a field.</summary>
    /// <param name="field">The field with its wells on.</param>
    /// <exception cref="DewateredException">The level at a screen falls to the base or below.</exception>
    public static ScreenLevels Of(FlowField field)
    {
        Parameters parameters = field.Parameters;
        ImmutableArray<double> none = [.. parameters.Rates.Select(_ => 0.0)];
        ScreenLevels levels = new(field, field.System.Solve(parameters with { Rates = none }));
        (int Well, double LargestRate)[] dewatered =
        [
            .. Enumerable.Range(0, parameters.Rates.Length)
                .Where(well => parameters.Rates[well] > 0 && !(levels.PotentialAt(field, well) > 0))
                .Select(well => (well, Math.Max(0, levels.LargestRate(well)))),
        ];
        return dewatered.Length == 0 ? levels : throw new DewateredException(dewatered);
    }

    /// <summary>Mean head round a screen, m elevation; well loss not included.</summary>
    /// <param name="well">Index of the well.</param>
    public double Head(int well) => Aquifer(well).HeadOf(PotentialAt(_on, well));

    /// <summary>Head with all wells off, less head with them on, m.</summary>
    /// <param name="well">Index of the well.</param>
    public double Drawdown(int well) => Aquifer(well).HeadOf(PotentialAt(_off, well)) - Head(well);

    /// <summary>Saturated thickness at a screen with the wells on, m.</summary>
    /// <param name="well">Index of the well.</param>
    public double Thickness(int well) => Aquifer(well).SaturatedThickness(PotentialAt(_on, well));

    /// <summary>Saturated thickness at a screen with the wells off, m.</summary>
    /// <param name="well">Index of the well.</param>
    public double ThicknessOff(int well) => Aquifer(well).SaturatedThickness(PotentialAt(_off, well));

    /// <summary>
    /// The other rates held, the rate that brings the level at the screen to the base, m3/d: the potential there is linear in it.
    /// </summary>
    /// <param name="well">Index of the well.</param>
    public double LargestRate(int well)
    {
        Parameters parameters = _on.Parameters;
        double rate = parameters.Rates[well];
        FlowField without = _on.System.Solve(parameters with { Rates = parameters.Rates.SetItem(well, 0) });
        FlowField unit = _on.System.Solve(parameters with { Rates = parameters.Rates.SetItem(well, 1) });
        double free = PotentialAt(without, well);
        double perRate = PotentialAt(unit, well) - free;
        return perRate < 0 ? -free / perRate : Math.Max(rate, 0);
    }

    /// <summary>The levels if the known head were held twice as far from the nearest well, all else the same.</summary>
    /// <returns>Null without wells, or where the aquifer is dry at that place.</returns>
    public (double Distance, FlowField On, FlowField Off)? KnownHeadTwiceAsFar()
    {
        RegionalFlow regional = _on.Parameters.Regional;
        Well? nearest = _on.System.Wells.MinBy(well => Complex.Abs(well.At - regional.HeadAt));
        if (nearest is null)
        {
            return null;
        }

        Aquifer aquifer = _on.Parameters.Aquifer;
        Complex at = nearest.At + 2 * (regional.HeadAt - nearest.At);
        double head = _off.HeadAt(at);
        if (!(head > aquifer.Base))
        {
            return null;
        }

        double thicknessHere = aquifer.SaturatedThickness(aquifer.PotentialOf(regional.Head));
        double thicknessThere = aquifer.SaturatedThickness(aquifer.PotentialOf(head));
        RegionalFlow moved = regional with
        {
            Head = head,
            HeadAt = at,
            Gradient = regional.Gradient * thicknessHere / thicknessThere,
        };
        FlowSystem system = FlowSystem.Assemble(_on.System.Model with { Regional = moved });
        Parameters on = _on.Parameters with { Regional = moved }, off = _off.Parameters with { Regional = moved };
        return (Complex.Abs(regional.HeadAt - nearest.At), system.Solve(on), system.Solve(off));
    }

    /// <summary>Drawdown at a place in any pair of fields, m.</summary>
    internal static double DrawdownAt(FlowField on, FlowField off, Complex at) => off.HeadAt(at) - on.HeadAt(at);

    /// <summary>Mean drawdown round a screen in any pair of fields, m.</summary>
    internal double Drawdown(FlowField on, FlowField off, int well) =>
        Aquifer(well).HeadOf(PotentialAt(off, well)) - Aquifer(well).HeadOf(PotentialAt(on, well));

    private Aquifer Aquifer(int well) => _on.AquiferAt(_on.System.Wells[well].At);

    private double PotentialAt(FlowField field, int well)
    {
        Well at = _on.System.Wells[well];
        double sum = 0;
        for (int i = 0; i < RingPoints; i++)
        {
            sum += field.FlowAt(at.At + Complex.FromPolarCoordinates(at.Radius, 2 * Math.PI * i / RingPoints)).Potential;
        }

        return sum / RingPoints;
    }
}

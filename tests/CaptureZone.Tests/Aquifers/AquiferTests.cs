using CaptureZone.Aquifers;
using FsCheck;
using FsCheck.Xunit;

namespace CaptureZone.Tests.Aquifers;

/// <summary>What holds for any aquifer; integers are turned into plausible values so that every example is one.</summary>
public sealed class AquiferTests
{
    /// <summary>Rounding of a head's conversion both ways, of the largest elevation involved.</summary>
    private const double Rounding = 1e-12;

    [Property(Replay = Draws.Seed)]
    public void A_head_above_the_base_survives_the_way_to_its_potential_and_back(
        PositiveInt conductivity, int floor, PositiveInt thickness, bool confined, PositiveInt above)
    {
        Aquifer aquifer = Of(conductivity, floor, thickness, confined);
        double head = aquifer.Base + above.Get / 7.0;
        Assert.Equal(head, aquifer.HeadOf(aquifer.PotentialOf(head)), Rounding * (Math.Abs(aquifer.Base) + head + 100));
    }

    [Property(Replay = Draws.Seed)]
    public void A_higher_head_has_a_higher_potential(
        PositiveInt conductivity, int floor, PositiveInt thickness, bool confined, PositiveInt above, PositiveInt more)
    {
        Aquifer aquifer = Of(conductivity, floor, thickness, confined);
        double low = aquifer.Base + above.Get / 7.0, high = low + more.Get / 11.0;
        Assert.True(aquifer.PotentialOf(high) > aquifer.PotentialOf(low));
        Assert.True(aquifer.SaturatedThickness(aquifer.PotentialOf(high)) >= aquifer.SaturatedThickness(aquifer.PotentialOf(low)));
    }

    /// <summary>dPhi/dh = K x saturated thickness on either side of the top, so it is one there.</summary>
    [Property(Replay = Draws.Seed)]
    public void Potential_has_one_value_and_one_slope_at_the_top(PositiveInt conductivity, int floor, PositiveInt thickness)
    {
        Aquifer aquifer = Of(conductivity, floor, thickness, confined: true);
        double top = aquifer.Top!.Value, step = 1e-4 * aquifer.Thickness;
        double transmissivity = aquifer.Conductivity * aquifer.Thickness;
        double below = (aquifer.PotentialOf(top) - aquifer.PotentialOf(top - step)) / step;
        double above = (aquifer.PotentialOf(top + step) - aquifer.PotentialOf(top)) / step;
        double allowed = (1e-4 + 1e-11 * Math.Abs(top) / step) * transmissivity;
        Assert.Equal(transmissivity, below, allowed);
        Assert.Equal(transmissivity, above, allowed);
        Assert.Equal(aquifer.PotentialAtTop, aquifer.PotentialOf(top), 1e-9 * (1 + Math.Abs(top)) * transmissivity);
    }

    [Property(Replay = Draws.Seed)]
    public void Heads_of_many_potentials_have_the_bits_of_one(
        PositiveInt conductivity, int floor, PositiveInt thickness, bool confined, int[] values)
    {
        Aquifer aquifer = Of(conductivity, floor, thickness, confined);
        double[] potentials = [.. values.Select(value => value * 31.7), -1, 0, double.NegativeInfinity, double.PositiveInfinity, double.NaN];
        double[] heads = new double[potentials.Length];
        aquifer.HeadsOf(potentials, heads);
        Assert.Equal(potentials.Select(aquifer.HeadOf), heads);
    }

    [Fact]
    public void A_negative_potential_is_dry()
    {
        Aquifer aquifer = new(Conductivity: 10, Base: 3, Top: 18, Porosity: 0.2);
        Assert.Equal(double.NaN, aquifer.HeadOf(-1e-9));
        Assert.Equal(0, aquifer.SaturatedThickness(-1e-9));
    }

    [Fact]
    public void A_head_below_the_base_has_the_potential_of_the_base() =>
        Assert.Equal(0, new Aquifer(Conductivity: 10, Base: 3, Top: 18, Porosity: 0.2).PotentialOf(1));

    [Fact]
    public void Flow_is_confined_from_the_top_up()
    {
        Aquifer aquifer = new(Conductivity: 10, Base: 3, Top: 18, Porosity: 0.2);
        Assert.True(aquifer.IsConfined(aquifer.PotentialOf(18)));
        Assert.False(aquifer.IsConfined(aquifer.PotentialOf(17.99)));
        Assert.False((aquifer with { Top = null }).IsConfined(aquifer.PotentialOf(1000)));
    }

    private static Aquifer Of(PositiveInt conductivity, int floor, PositiveInt thickness, bool confined)
    {
        double bottom = floor % 1000;
        return new(conductivity.Get / 3.0, bottom, confined ? bottom + thickness.Get / 5.0 : null, 0.25);
    }
}

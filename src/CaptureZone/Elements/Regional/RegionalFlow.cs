using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Flow;

namespace CaptureZone.Elements.Regional;

/// <summary>
/// Uniform regional flow with one known head: discharge Q0 = K x saturated thickness at <see cref="HeadAt"/> x gradient, the
/// same everywhere; the head is held at its place with everything acting.
/// </summary>
/// <param name="Gradient">Hydraulic gradient, m/m; 0 for none.</param>
/// <param name="Direction">The way the water moves, radians counter-clockwise from east.</param>
/// <param name="Head">The known head, m elevation.</param>
/// <param name="HeadAt">Where it is known, m.</param>
public sealed record RegionalFlow(double Gradient, double Direction, double Head, Complex HeadAt) : Element("regional flow")
{
    /// <summary>The uniform discharge vector Qx + i Qy, m2/d.</summary>
    /// <param name="aquifer">The aquifer at <see cref="HeadAt"/>.</param>
    public Complex Discharge(Aquifer aquifer)
    {
        double thickness = aquifer.SaturatedThickness(aquifer.PotentialOf(Head));
        return Complex.FromPolarCoordinates(aquifer.Conductivity * thickness * Gradient, Direction);
    }

    /// <inheritdoc/>
    public override void Contribute(SystemBuilder to)
    {
        to.AddKnown(new UniformBank(HeadAt), static (parameters, strength) =>
        {
            Complex discharge = parameters.Regional.Discharge(parameters.Aquifer);
            strength[0] = discharge.Real;
            strength[1] = discharge.Imaginary;
        });
        to.AddUnknown(new ConstantBank());
        to.AddEquation(new KnownHead(HeadAt));
    }
}

using System.Numerics;
using CaptureZone.Flow;

namespace CaptureZone.Elements.Wells;

/// <summary>What a well is for.</summary>
public enum WellPurpose
{
    /// <summary>Neither of the others, or not said.</summary>
    Other,

    /// <summary>To contain a plume: only these count toward capture.</summary>
    Containment,

    /// <summary>To supply water: plume water that reaches it is an escape.</summary>
    Supply,
}

/// <summary>A vertical well over the aquifer's whole thickness.</summary>
/// <param name="Name">Its name, unique among the wells.</param>
/// <param name="At">Its axis, m.</param>
/// <param name="Rate">What it takes out, m3/d; negative when it injects; 0 when it stands idle.</param>
/// <param name="Radius">Radius of the screen's bore, m; positive.</param>
/// <param name="Purpose">What it is for.</param>
public sealed record Well(string Name, Complex At, double Rate, double Radius, WellPurpose Purpose) : Element(Name)
{
    /// <inheritdoc/>
    public override void Contribute(SystemBuilder to) => to.Shared<WellGathering>().Add(this);
}

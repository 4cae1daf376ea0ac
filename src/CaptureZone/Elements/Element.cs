using CaptureZone.Flow;

namespace CaptureZone.Elements;

/// <summary>
/// One thing in the aquifer that moves water or stands in its way. An element is a description only, in metres and days; what it
/// means for the flow it says in <see cref="Contribute"/>.
/// </summary>
/// <param name="Name">Its name, unique among elements of its kind.</param>
public abstract record Element(string Name)
{
    /// <summary>Hands the element's banks, strengths, equations and ends of paths to the system that is being assembled.</summary>
    /// <param name="to">The system under assembly.</param>
    public abstract void Contribute(SystemBuilder to);
}

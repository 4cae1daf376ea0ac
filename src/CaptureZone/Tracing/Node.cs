using System.Numerics;

namespace CaptureZone.Tracing;

/// <summary>A particle between two steps.</summary>
/// <param name="At">Where, m.</param>
/// <param name="Time">Since the start, d.</param>
/// <param name="Length">Arc length since the start, m.</param>
/// <param name="Direction">Unit vector along the path.</param>
/// <param name="Speed">Norm of the discharge vector, m2/d.</param>
/// <param name="Slowness">Time per length, d/m.</param>
/// <param name="Potential">Discharge potential, m3/d.</param>
internal readonly record struct Node(
    Complex At, double Time, double Length, Complex Direction, double Speed, double Slowness, double Potential);

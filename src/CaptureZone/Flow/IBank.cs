using System.Numerics;

namespace CaptureZone.Flow;

/// <summary>
/// All members of one kind of elementary solution, as structure of arrays: geometry only. What they add to the flow is linear in
/// one strength per column; the strengths belong to a <see cref="FlowField"/>, so that one bank serves many fields.
/// Implementations are immutable and thread-safe, and give the same bits for a point whatever the block it is asked in.
/// </summary>
public interface IBank
{
    /// <summary>How many strengths it takes.</summary>
    int Columns { get; }

    /// <summary>What of the flow it adds to; it is not asked for the rest alone.</summary>
    Ask Gives => Ask.Potential | Ask.Discharge | Ask.Gradient;

    /// <summary>Adds what the bank contributes at points.</summary>
    /// <param name="at">The points.</param>
    /// <param name="side">Which limit, for points on one of the bank's lines.</param>
    /// <param name="ask">What is wanted.</param>
    /// <param name="strength">One value per column, in the bank's own unit.</param>
    /// <param name="into">Where it is added.</param>
    void Add(Points at, Side side, Ask ask, ReadOnlySpan<double> strength, in FlowBlock into);

    /// <summary>
    /// Adds what the bank contributes at one point, with the bits of <see cref="Add"/>. Paths are traced through this, a point at
    /// a time: a bank that can do it without a detour through blocks should.
    /// </summary>
    /// <param name="x">Easting, m.</param>
    /// <param name="y">Northing, m.</param>
    /// <param name="side">Which limit, for a point on one of the bank's lines.</param>
    /// <param name="ask">What is wanted.</param>
    /// <param name="strength">One value per column, in the bank's own unit.</param>
    /// <param name="into">Where it is added.</param>
    void AddAt(double x, double y, Side side, Ask ask, ReadOnlySpan<double> strength, ref PointFlow into) => Add(
        new Points(new(in x), new(in y)),
        side,
        ask,
        strength,
        new FlowBlock
        {
            Potential = new(ref into.Potential),
            Qx = new(ref into.Qx),
            Qy = new(ref into.Qy),
            Qxx = new(ref into.Qxx),
            Qxy = new(ref into.Qxy),
            Qyy = new(ref into.Qyy),
        });

    /// <summary>
    /// What each column contributes at each point for a strength of one. For <see cref="Ask.Potential"/> one row a point; for
    /// <see cref="Ask.Discharge"/> two rows a point (Qx, Qy); with both, three rows a point (potential first).
    /// </summary>
    /// <param name="at">The points.</param>
    /// <param name="side">Which limit, for points on one of the bank's lines.</param>
    /// <param name="ask">Potential, discharge or both.</param>
    /// <param name="rows">Row after row, each <paramref name="stride"/> apart.</param>
    /// <param name="stride">Distance between rows; at least <see cref="Columns"/>.</param>
    void Influence(Points at, Side side, Ask ask, Span<double> rows, int stride);

    /// <summary>
    /// Flow across the straight segment from a to b, m3/d, positive from its left to its right. Closed form, no branch cuts.
    /// </summary>
    /// <param name="a">Start, m.</param>
    /// <param name="b">End, m.</param>
    /// <param name="strength">One value per column.</param>
    double FluxAcross(Complex a, Complex b, ReadOnlySpan<double> strength);

    /// <summary>
    /// A bound on the norm of the derivative of the discharge vector everywhere in a disc, m/d; infinite when a singular place of
    /// the bank lies in it.
    /// </summary>
    /// <param name="centre">The disc's centre, m.</param>
    /// <param name="radius">The disc's radius, m.</param>
    /// <param name="strength">One value per column.</param>
    double GradientBound(Complex centre, double radius, ReadOnlySpan<double> strength);

    /// <summary>What the bank takes out of the aquifer in all, m3/d; negative when it adds water.</summary>
    /// <param name="strength">One value per column.</param>
    double NetRate(ReadOnlySpan<double> strength);

    /// <summary>Divergence of the discharge vector at a point that lies on no singular place, m/d: recharge.</summary>
    /// <param name="at">The point, m.</param>
    /// <param name="strength">One value per column.</param>
    double DivergenceAt(Complex at, ReadOnlySpan<double> strength);

    /// <summary>Distance from a point to the nearest singular place of the bank, m; infinite when it has none.</summary>
    /// <param name="at">The point, m.</param>
    double DistanceToSingular(Complex at);
}

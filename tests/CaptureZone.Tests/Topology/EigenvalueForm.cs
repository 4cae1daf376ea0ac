using System.Numerics;
using MathNet.Numerics.LinearAlgebra;

namespace CaptureZone.Tests.Topology;

/// <summary>
/// Stagnation points as eigenvalues: by the determinant lemma, det(z I - diag(z_j) - t t^T / W0) is prod (z - z_j) W / W0 with
/// t_j = sqrt(q_j / 2 pi), imaginary for injection. Shares nothing with the iteration.
/// </summary>
public static class EigenvalueForm
{
    public static Complex[] With(Complex uniform, Complex[] places, double[] rates)
    {
        Complex[] root = [.. rates.Select(rate => Complex.Sqrt(rate / (2 * Math.PI)))];
        Matrix<Complex> matrix = Matrix<Complex>.Build.Dense(
            places.Length,
            places.Length,
            (i, j) => (i == j ? places[i] - places[0] : 0) + root[i] * root[j] / uniform);
        return [.. Eigenvalues(matrix).Select(value => places[0] + value)];
    }

    /// <summary>
    /// Without uniform flow: sum s_j / (z - z_j) is zero where (z I - diag(z_j)) x = a multiple of (1, ..., 1) with s^T x = 0.
    /// Differences of rows take out the multiple; the condition takes out the unknown of the strongest well. Solved for
    /// 1 / (z - c) about a place c outside the site, so that zeros far away or at infinity spoil no other.
    /// </summary>
    public static Complex[] Without(Complex[] places, double[] rates)
    {
        int size = places.Length - 1;
        if (size == 0)
        {
            return [];
        }

        int[] order = [.. Enumerable.Range(0, places.Length).OrderBy(j => Math.Abs(rates[j]))];
        double reach = places.Max(place => Complex.Abs(place - places[0]));
        Complex outside = places[0] + new Complex(reach, 1.5 * reach);
        Complex Z(int j) => places[order[j]] - outside;
        double Ratio(int j) => rates[order[j]] / rates[order[size]];
        Matrix<Complex> identity = Matrix<Complex>.Build.Dense(size, size, (i, j) => (i == j ? 1 : 0) + Ratio(j));
        Matrix<Complex> matrix = Matrix<Complex>.Build.Dense(size, size, (i, j) => (i == j ? Z(i) : 0) + Z(size) * Ratio(j));
        return [.. Eigenvalues(matrix.Solve(identity)).Select(value => outside + 1 / value)];
    }

    private static Complex[] Eigenvalues(Matrix<Complex> matrix) => [.. matrix.Evd(Symmetricity.Asymmetric).EigenValues];
}

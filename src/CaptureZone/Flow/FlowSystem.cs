using CaptureZone.Elements;
using CaptureZone.Elements.Wells;
using MathNet.Numerics.LinearAlgebra.Double;

namespace CaptureZone.Flow;

/// <summary>
/// What a model superposes, assembled once from its geometry; solved for as many sets of parameters as are asked.
/// Immutable and thread-safe.
/// </summary>
public sealed class FlowSystem
{
    private readonly IBank[] _known;
    private readonly KnownStrength[] _strengths;
    private readonly IBank[] _unknown;
    private readonly IEquation[] _equations;
    private readonly double[][] _influence;
    private readonly int _columns;

    private FlowSystem(Model model, SystemBuilder parts)
    {
        Model = model;
        Wells = [.. model.Wells];
        _known = [.. parts.Known.Select(entry => entry.Bank)];
        _strengths = [.. parts.Known.Select(entry => entry.Strength)];
        _unknown = [.. parts.Unknown];
        _equations = [.. parts.Equations];
        _columns = _unknown.Sum(bank => bank.Columns);
        _influence = [.. _equations.Select(InfluenceOn)];
    }

    /// <summary>The model it was assembled from.</summary>
    public Model Model { get; }

    internal Well[] Wells { get; }

    /// <summary>Assembles what a model superposes.</summary>
    /// <param name="model">The model.</param>
    public static FlowSystem Assemble(Model model)
    {
        SystemBuilder parts = new();
        model.Regional.Contribute(parts);
        foreach (Element element in model.Elements)
        {
            element.Contribute(parts);
        }

        parts.Finish();
        return new FlowSystem(model, parts);
    }

    /// <summary>The field for the parameters that the model states.</summary>
    public FlowField Solve() => Solve(Parameters.Of(Model));

    /// <summary>The field for other parameters over the same geometry.</summary>
    /// <param name="parameters">The parameters.</param>
    public FlowField Solve(Parameters parameters)
    {
        double[][] known = new double[_known.Length][];
        for (int i = 0; i < known.Length; i++)
        {
            known[i] = new double[_known[i].Columns];
            _strengths[i](parameters, known[i]);
        }

        FlowField partial = new(this, parameters, _known, known);
        double[] solution = SolveUnknowns(parameters, partial);
        double[][] unknown = new double[_unknown.Length][];
        for (int i = 0, first = 0; i < unknown.Length; first += _unknown[i].Columns, i++)
        {
            unknown[i] = solution[first..(first + _unknown[i].Columns)];
        }

        return new FlowField(this, parameters, [.. _known, .. _unknown], [.. known, .. unknown]);
    }

    private double[] SolveUnknowns(Parameters parameters, FlowField known)
    {
        double[,] matrix = new double[_equations.Length, _columns];
        double[] right = new double[_equations.Length];
        double[] row = new double[_columns];
        for (int i = 0; i < _equations.Length; i++)
        {
            Array.Clear(row);
            IEquation equation = _equations[i];
            _equations[i].Row(parameters, RowsOf(i), known.FlowAt(equation.At, equation.Side), row, out right[i]);
            for (int k = 0; k < _columns; k++)
            {
                matrix[i, k] = row[k];
            }
        }

        return _columns == 1 && _equations.Length == 1
            ? [right[0] / matrix[0, 0]]
            : DenseMatrix.OfArray(matrix).QR().Solve(DenseVector.OfArray(right)).ToArray();
    }

    private double[] InfluenceOn(IEquation equation)
    {
        double[] rows = new double[RowCount(equation.Needs) * _columns];
        double[] x = [equation.At.Real], y = [equation.At.Imaginary];
        int first = 0;
        foreach (IBank bank in _unknown)
        {
            bank.Influence(new Points(x, y), equation.Side, equation.Needs, rows.AsSpan(first), _columns);
            first += bank.Columns;
        }

        return rows;
    }

    private InfluenceRows RowsOf(int equation)
    {
        Ask needs = _equations[equation].Needs;
        double[] rows = _influence[equation];
        int discharge = needs.HasFlag(Ask.Potential) ? _columns : 0;
        return new InfluenceRows
        {
            Potential = needs.HasFlag(Ask.Potential) ? rows.AsSpan(0, _columns) : default,
            Qx = needs.HasFlag(Ask.Discharge) ? rows.AsSpan(discharge, _columns) : default,
            Qy = needs.HasFlag(Ask.Discharge) ? rows.AsSpan(discharge + _columns, _columns) : default,
        };
    }

    private static int RowCount(Ask ask) => (ask.HasFlag(Ask.Potential) ? 1 : 0) + (ask.HasFlag(Ask.Discharge) ? 2 : 0);
}

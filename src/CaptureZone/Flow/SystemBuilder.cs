namespace CaptureZone.Flow;

/// <summary>Writes the strengths of a bank that are known from the parameters.</summary>
/// <param name="parameters">What the field is solved for.</param>
/// <param name="strength">One value per column of the bank.</param>
public delegate void KnownStrength(Parameters parameters, Span<double> strength);

/// <summary>Gathers elements of one kind until all have contributed.</summary>
public interface IGathering
{
    /// <summary>Hands over what was gathered; called once, after every element has contributed.</summary>
    /// <param name="to">The system under assembly.</param>
    void Finish(SystemBuilder to);
}

/// <summary>The parts of a flow system while its elements contribute to it.</summary>
public sealed class SystemBuilder
{
    private readonly List<IGathering> _gatherings = [];
    private readonly List<(IBank Bank, KnownStrength Strength)> _known = [];
    private readonly List<IBank> _unknown = [];
    private readonly List<IEquation> _equations = [];

    internal IReadOnlyList<(IBank Bank, KnownStrength Strength)> Known => _known;

    internal IReadOnlyList<IBank> Unknown => _unknown;

    internal IReadOnlyList<IEquation> Equations => _equations;

    /// <summary>Adds a bank whose strengths follow from the parameters.</summary>
    /// <param name="bank">The bank.</param>
    /// <param name="strength">Gives its strengths.</param>
    public void AddKnown(IBank bank, KnownStrength strength) => _known.Add((bank, strength));

    /// <summary>Adds a bank whose strengths the equations decide.</summary>
    /// <param name="bank">The bank.</param>
    public void AddUnknown(IBank bank) => _unknown.Add(bank);

    /// <summary>Adds one condition.</summary>
    /// <param name="equation">The condition.</param>
    public void AddEquation(IEquation equation) => _equations.Add(equation);

    /// <summary>The one gathering of a kind, for elements that share a bank.</summary>
    /// <typeparam name="T">The kind of gathering.</typeparam>
    public T Shared<T>()
        where T : IGathering, new()
    {
        foreach (IGathering gathering in _gatherings)
        {
            if (gathering is T found)
            {
                return found;
            }
        }

        T made = new();
        _gatherings.Add(made);
        return made;
    }

    internal void Finish()
    {
        foreach (IGathering gathering in _gatherings)
        {
            gathering.Finish(this);
        }
    }
}

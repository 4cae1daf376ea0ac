namespace CaptureZone.Flow;

/// <summary>Edges of a grid linked in pairs into chains; an edge has two neighbours at most.</summary>
/// <param name="edges">How many edges the grid has.</param>
internal sealed class EdgeChains(int edges)
{
    private const int None = -1;
    private readonly int[] _neighbours = NoneOf(2 * edges);
    private readonly bool[] _told = new bool[edges];
    private readonly List<int> _linked = [];

    /// <summary>Takes all links away.</summary>
    public void Clear()
    {
        foreach (int edge in _linked)
        {
            _neighbours[2 * edge] = _neighbours[2 * edge + 1] = None;
            _told[edge] = false;
        }

        _linked.Clear();
    }

    /// <summary>Links two edges.</summary>
    /// <param name="a">One.</param>
    /// <param name="b">The other.</param>
    public void Link(int a, int b)
    {
        Attach(a, b);
        Attach(b, a);
    }

    /// <summary>All chains, edge by edge; a closed one ends with the edge it begins with. Each is told once.</summary>
    public IEnumerable<List<int>> All()
    {
        foreach (int end in _linked.Where(edge => _neighbours[2 * edge + 1] == None))
        {
            if (!_told[end])
            {
                yield return Follow(end);
            }
        }

        foreach (int edge in _linked)
        {
            if (!_told[edge])
            {
                List<int> chain = Follow(edge);
                chain.Add(edge);
                yield return chain;
            }
        }
    }

    private static int[] NoneOf(int count)
    {
        int[] array = new int[count];
        Array.Fill(array, None);
        return array;
    }

    private void Attach(int edge, int neighbour)
    {
        if (_neighbours[2 * edge] == None)
        {
            _neighbours[2 * edge] = neighbour;
            _linked.Add(edge);
        }
        else
        {
            _neighbours[2 * edge + 1] = neighbour;
        }
    }

    private List<int> Follow(int from)
    {
        List<int> chain = [];
        for (int edge = from; edge != None;)
        {
            _told[edge] = true;
            chain.Add(edge);
            int one = _neighbours[2 * edge], other = _neighbours[2 * edge + 1];
            edge = !_told[one] ? one : other != None && !_told[other] ? other : None;
        }

        return chain;
    }
}

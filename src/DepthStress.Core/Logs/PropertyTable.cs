namespace DepthStress.Core.Logs;

/// <summary>One array of doubles per property that is present, all of one length; NaN means missing.</summary>
public sealed class PropertyTable
{
    private readonly double[]?[] _columns = new double[]?[Enum.GetValues<Property>().Length];

    /// <summary>Makes an empty table for so many samples.</summary>
    public PropertyTable(int count) => Count = count;

    /// <summary>Number of samples.</summary>
    public int Count { get; }

    /// <summary>True when the property has a column.</summary>
    public bool Has(Property property) => _columns[(int)property] is not null;

    /// <summary>The property's values, empty when it has no column.</summary>
    public ReadOnlySpan<double> Read(Property property) => _columns[(int)property];

    /// <summary>The property's own array, to be read only by what cannot hold a span; null when it has no column.</summary>
    internal double[]? Held(Property property) => _columns[(int)property];

    /// <summary>The property's values to be written; a new column starts as all missing.</summary>
    public Span<double> Write(Property property)
    {
        ref var column = ref _columns[(int)property];
        if (column is null)
        {
            column = GC.AllocateUninitializedArray<double>(Count);
            Array.Fill(column, double.NaN);
        }

        return column;
    }

    /// <summary>Adopts an array as the property's column, without copying.</summary>
    /// <exception cref="ArgumentException">The array's length is not <see cref="Count"/>.</exception>
    public void Adopt(Property property, double[] values)
    {
        ArgumentNullException.ThrowIfNull(values);
        if (values.Length != Count) throw new ArgumentException("The column's length differs from the table's.", nameof(values));
        _columns[(int)property] = values;
    }

    /// <summary>A table that shares every column but some, which it lacks: what is written there stays its own.</summary>
    internal PropertyTable Sharing(params ReadOnlySpan<Property> without)
    {
        var table = new PropertyTable(Count);
        _columns.CopyTo(table._columns, 0);
        foreach (var property in without) table._columns[(int)property] = null;
        return table;
    }
}

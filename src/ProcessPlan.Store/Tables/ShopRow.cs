namespace ProcessPlan.Store.Tables;

/// <summary>A row of any table: its cells in the order of the table's columns.</summary>
/// <param name="Id">The row's number, which never changes and never belongs to another row.</param>
/// <param name="Cells">The values.</param>
/// <param name="Retired">The day on which it left the shop; null while it belongs to it.</param>
internal sealed record ShopRow(long Id, object?[] Cells, string? Retired = null)
{
    private const byte Stays = 0;
    private const byte IsRetired = 1;

    public void Write(BinaryWriter target, BookTable table)
    {
        target.Write7BitEncodedInt64(Id);
        target.Write(Retired is null ? Stays : IsRetired);
        if (Retired is not null)
        {
            target.Write(Retired);
        }

        for (int i = 0; i < Cells.Length; i++)
        {
            table.Columns[i].Kind.WriteBinary(target, Cells[i]);
        }
    }

    public static ShopRow Read(BinaryReader source, BookTable table)
    {
        long id = source.Read7BitEncodedInt64();
        string? retired = source.ReadByte() == IsRetired ? source.ReadString() : null;
        object?[] cells = new object?[table.Columns.Count];
        for (int i = 0; i < cells.Length; i++)
        {
            cells[i] = table.Columns[i].Kind.ReadBinary(source);
        }

        return new ShopRow(id, cells, retired);
    }
}

/// <summary>Takes the cells of a row one after the other, by the type that they have.</summary>
internal struct RowCells(ShopRow row)
{
    private int _next;

    public T Take<T>() => (T)row.Cells[_next++]!;
}

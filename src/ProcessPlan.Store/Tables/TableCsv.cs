using System.Globalization;
using LiteDB;
using nietras.SeparatedValues;

namespace ProcessPlan.Store.Tables;

/// <summary>A table as CSV: one line a row, the row's number first, sizes in mm as exact decimals; to be edited by hand or in a spreadsheet and read back.</summary>
public static class TableCsv
{
    private const string Id = "id";

    public static void Write(BookTable table, ShopEdition edition, TextWriter target)
    {
        using SepWriter writer = Sep.New(',').Writer(static options => options with { Escape = true }).To(target, leaveOpen: true);
        foreach (BsonDocument document in table.Documents(edition))
        {
            using SepWriter.Row row = writer.NewRow();
            row[Id].Set(document[BookTable.Id].AsInt64.ToString(CultureInfo.InvariantCulture));
            foreach (Column column in table.Columns)
            {
                string text = column.Format(document);
                row[column.Name].Set(column.Kind.IsFreeText ? SheetText.Neutralise(text) : text);
            }
        }
    }

    /// <summary>
    /// Reads the table whole and holds it against the shop: a line with a number is that row, one without is the row with the same key that no other line is,
    /// or else a new row; a row that no line is retires. Nothing is changed yet.
    /// </summary>
    public static TableImport Read(BookTable table, ShopEdition edition, TextReader source)
    {
        ImportReader reader = new(table, edition);
        try
        {
            using SepReader rows = Sep.Reader(static options => options with { HasHeader = false, Unescape = true, DisableColCountCheck = true }).From(source);
            bool isTable = rows.MoveNext() && reader.TakesHead(rows.Current);
            while (isTable && rows.MoveNext())
            {
                reader.Take(rows.Current);
            }
        }
        catch (InvalidDataException broken)
        {
            reader.Refuse($"The file is no CSV: {broken.Message}");
        }

        return reader.Result();
    }

    private sealed class ImportReader(BookTable table, ShopEdition edition)
    {
        private readonly Dictionary<long, BsonDocument> _rows = table.Documents(edition).ToDictionary(static row => row[BookTable.Id].AsInt64);
        private readonly Dictionary<long, int> _lineOf = [];
        private readonly List<(int Line, BsonDocument Row)> _unnumbered = [];
        private readonly List<(int Line, long Id, BsonDocument Row)> _numbered = [];
        private readonly Dictionary<string, int> _lineOfKey = new(StringComparer.Ordinal);
        private readonly List<string> _problems = [];
        private int[] _places = [];
        private int _idPlace;
        private int _width;

        public void Refuse(string problem) => _problems.Add(problem);

        public bool TakesHead(SepReader.Row names)
        {
            string[] expected = [Id, .. table.Columns.Select(static column => column.Name)];
            List<string> head = [];
            for (int i = 0; i < names.ColCount; i++)
            {
                head.Add(names[i].ToString().Trim());
            }

            foreach (string name in head.Where(name => head.IndexOf(name) != head.LastIndexOf(name)).Distinct())
            {
                Refuse($"line 1: the column {name} stands there twice");
            }

            foreach (string name in head.Where(name => !expected.Contains(name)))
            {
                Refuse($"line 1: '{name}' is no column of {table.Name}; expected {string.Join(", ", expected)}");
            }

            foreach (string name in expected.Skip(1).Where(name => !head.Contains(name)))
            {
                Refuse($"line 1: the column {name} of {table.Name} is missing");
            }

            _idPlace = head.IndexOf(Id);
            _places = [.. table.Columns.Select(column => head.IndexOf(column.Name))];
            _width = head.Count;
            return _problems.Count == 0;
        }

        public void Take(SepReader.Row cells)
        {
            int line = cells.LineNumberFrom;
            if (cells.Span.IsEmpty)
            {
                return;
            }

            if (cells.ColCount != _width)
            {
                Refuse($"line {line}: {cells.ColCount} cells stand there; expected {_width}, as in line 1");
                return;
            }

            int before = _problems.Count;
            BsonDocument row = [];
            for (int i = 0; i < _places.Length; i++)
            {
                Column column = table.Columns[i];
                string text = cells[_places[i]].ToString();
                bool isRead = column.Kind.TryRead(column.Kind.IsFreeText ? SheetText.Restore(text) : text.Trim(), out BsonValue value);
                row[column.Name] = value;
                if (!isRead || !column.Kind.Holds(value))
                {
                    Refuse($"line {line}, {column.Name}: '{text}' is not understood; expected {column.Kind.Expected}");
                }
            }

            if (_problems.Count == before && table.Complaint(row) is { } complaint)
            {
                Refuse($"line {line}: {complaint}");
            }

            if (table.IsKeyUnique && _problems.Count == before && !_lineOfKey.TryAdd(table.KeyOf(row), line))
            {
                Refuse($"line {line}: {table.One} '{table.KeyOf(row)}' stands in line {_lineOfKey[table.KeyOf(row)]} already");
            }

            Number(line, _idPlace < 0 ? "" : cells[_idPlace].ToString().Trim(), row);
        }

        public TableImport Result()
        {
            if (_problems.Count == 0 && _width == 0)
            {
                Refuse($"The file is empty; expected the columns of {table.Name}");
            }

            if (_problems.Count > 0)
            {
                return new TableImport(table, _problems, [], 0);
            }

            ILookup<string, long> free = _rows.Keys.Where(id => !_lineOf.ContainsKey(id)).ToLookup(id => table.KeyOf(_rows[id]));
            Dictionary<string, Queue<long>> byKey = free.ToDictionary(static group => group.Key, static group => new Queue<long>(group), StringComparer.Ordinal);
            List<RowDifference> added = [];
            List<(int Line, long Id, BsonDocument Row)> kept = _numbered;
            foreach ((int line, BsonDocument row) in _unnumbered)
            {
                if (byKey.TryGetValue(table.KeyOf(row), out Queue<long>? ids) && ids.TryDequeue(out long id))
                {
                    kept.Add((line, id, row));
                }
                else
                {
                    added.Add(new RowDifference(RowFate.Added, null, table.KeyOf(row), [], new RowChange(table, null, row)));
                }
            }

            List<RowDifference> changed = [];
            foreach ((_, long id, BsonDocument row) in kept.OrderBy(static row => row.Id))
            {
                BsonDocument before = _rows[id];
                CellDifference[] cells = [.. table.Columns.Where(column => row[column.Name] != before[column.Name])
                    .Select(column => new CellDifference(column.Name, column.Format(before), column.Format(row)))];
                if (cells.Length > 0)
                {
                    changed.Add(new RowDifference(RowFate.Changed, id, table.KeyOf(before), cells, new RowChange(table, id, row)));
                }
            }

            IEnumerable<RowDifference> retired = _rows.Keys.Except(kept.Select(static row => row.Id)).Order()
                .Select(id => new RowDifference(RowFate.Retired, id, table.KeyOf(_rows[id]), [], table.Retire(id)));
            return new TableImport(table, [], [.. retired, .. changed, .. added], kept.Count - changed.Count);
        }

        private void Number(int line, string text, BsonDocument row)
        {
            if (text.Length == 0)
            {
                _unnumbered.Add((line, row));
            }
            else if (!long.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out long id) || !_rows.ContainsKey(id))
            {
                Refuse($"line {line}, {Id}: there is no row {text} in {table.Name}; a new row has no number");
            }
            else if (!_lineOf.TryAdd(id, line))
            {
                Refuse($"line {line}, {Id}: row {id} stands in line {_lineOf[id]} already");
            }
            else
            {
                _numbered.Add((line, id, row));
            }
        }
    }
}

using System.Text.Json;

namespace ProcessPlan.Store.Tables;

/// <summary>One kind of cell: what it may hold, and how that stands in the book, in a table that is edited by hand, and in JSON.</summary>
/// <param name="expected">What such a cell holds, for the sentence that says what else was found.</param>
internal abstract partial class CellKind(string expected)
{
    public static readonly CellKind Name = new TextCell("a name of at most 200 characters", 200, mayBeEmpty: false);
    public static readonly CellKind Designation = new TextCell("a name of at most 40 characters", 40, mayBeEmpty: false);
    public static readonly CellKind Text = new TextCell("text of at most 2000 characters", 2000, mayBeEmpty: true);
    public static readonly CellKind Words = new WordsCell();
    public static readonly CellKind Size = new SizeCell();
    public static readonly CellKind Sizes = new SizesCell();
    public static readonly CellKind Amount = new AmountCell();
    public static readonly CellKind Number = new NumberCell();
    public static readonly CellKind NumberOrNothing = new NumberOrNothingCell();
    public static readonly CellKind Count = new CountCell();
    public static readonly CellKind YesOrNo = new YesOrNoCell();

    public string Expected => expected;

    /// <summary>Whether the text is free, so that a spreadsheet could take it for a formula.</summary>
    public virtual bool IsFreeText => false;

    /// <summary>Whether its texts stand under each other by their ends.</summary>
    public virtual bool IsNumber => true;

    public static CellKind OneOf(params string[] words) => new OneOfCell(words);

    /// <summary>Whether the value may stand in the book.</summary>
    public abstract bool Holds(object? value);

    public abstract string Format(object? value);

    /// <summary>The value that a text means; it may still be one that the book does not hold.</summary>
    public abstract bool TryRead(string text, out object? value);

    public abstract void WriteJson(Utf8JsonWriter json, object? value);

    public abstract void WriteBinary(BinaryWriter target, object? value);

    public abstract object? ReadBinary(BinaryReader source);
}

/// <summary>A kind of cell with the type of its values.</summary>
internal abstract class CellKind<T>(string expected) : CellKind(expected)
    where T : notnull
{
    public sealed override string Format(object? value) => Format((T)value!);

    public sealed override bool Holds(object? value) => value is T typed && Holds(typed);

    public sealed override bool TryRead(string text, out object? value)
    {
        bool isRead = TryRead(text, out T read);
        value = read;
        return isRead;
    }

    public sealed override void WriteJson(Utf8JsonWriter json, object? value) => WriteJson(json, (T)value!);

    public sealed override void WriteBinary(BinaryWriter target, object? value) => Write(target, (T)value!);

    public sealed override object? ReadBinary(BinaryReader source) => Read(source);

    protected abstract bool Holds(T value);

    protected abstract string Format(T value);

    protected abstract bool TryRead(string text, out T value);

    /// <summary>Numbers as they are written; a number's text is JSON already.</summary>
    protected virtual void WriteJson(Utf8JsonWriter json, T value) => json.WriteRawValue(Format(value));

    protected abstract void Write(BinaryWriter target, T value);

    protected abstract T Read(BinaryReader source);
}

using System.Globalization;
using System.Text.Json;
using LiteDB;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Store.Tables;

/// <summary>One kind of cell: how its values stand in the book, in a table that is edited by hand, and in JSON.</summary>
/// <param name="expected">What such a cell holds, for the sentence that says what else was found.</param>
internal abstract class CellKind(string expected)
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

    /// <summary>Whether the value may stand in the book.</summary>
    public abstract bool Holds(BsonValue value);

    public abstract string Format(BsonValue value);

    /// <summary>The value that a text means; it may still be one that the book does not hold.</summary>
    public abstract bool TryRead(string text, out BsonValue value);

    /// <summary>Numbers as they are written; a number's text is JSON already.</summary>
    public virtual void WriteJson(Utf8JsonWriter json, BsonValue value) => json.WriteRawValue(Format(value));

    public static CellKind OneOf(params string[] words) => new OneOfCell(words);

    private class TextCell(string expected, int most, bool mayBeEmpty) : CellKind(expected)
    {
        public override bool IsNumber => false;

        public override bool IsFreeText => true;

        public override bool Holds(BsonValue value) => value.IsString && value.AsString is var text && text.Length <= most && IsWellFormed(text)
            && (mayBeEmpty || !string.IsNullOrWhiteSpace(text));

        public override string Format(BsonValue value) => value.AsString;

        public override bool TryRead(string text, out BsonValue value)
        {
            value = text;
            return true;
        }

        public override void WriteJson(Utf8JsonWriter json, BsonValue value) => json.WriteStringValue(value.AsString);
    }

    private sealed class OneOfCell(string[] words) : TextCell("one of " + string.Join(", ", words), int.MaxValue, mayBeEmpty: false)
    {
        public override bool IsFreeText => false;

        public override bool Holds(BsonValue value) => value.IsString && words.Contains(value.AsString);
    }

    private sealed class WordsCell() : CellKind($"words of at most 40 characters parted by '{Between}'")
    {
        private const char Between = ';';
        private const int Longest = 40;
        private const int Most = 50;

        public override bool IsNumber => false;

        public override bool IsFreeText => true;

        public override bool Holds(BsonValue value) => value.IsArray && value.AsArray.Count <= Most && value.AsArray.All(static word => word.IsString
            && word.AsString is { Length: > 0 and <= Longest } text && text.Trim() == text && !text.Contains(Between, StringComparison.Ordinal) && IsWellFormed(text));

        public override string Format(BsonValue value) => string.Join(Between, value.AsArray.Select(static word => word.AsString));

        public override bool TryRead(string text, out BsonValue value)
        {
            value = text.Length == 0 ? new BsonArray() : new BsonArray(text.Split(Between, StringSplitOptions.TrimEntries).Select(static word => new BsonValue(word)));
            return true;
        }

        public override void WriteJson(Utf8JsonWriter json, BsonValue value)
        {
            json.WriteStartArray();
            foreach (BsonValue word in value.AsArray)
            {
                json.WriteStringValue(word.AsString);
            }

            json.WriteEndArray();
        }
    }

    private sealed class SizeCell() : CellKind("a size in mm, such as 25.012")
    {
        public override bool Holds(BsonValue value) => IsSize(value);

        public override string Format(BsonValue value) => new Length(value.AsInt64).Format();

        public override bool TryRead(string text, out BsonValue value) => TryReadSize(text, out value);
    }

    private sealed class SizesCell() : CellKind($"sizes in mm parted by '{Between}', such as 10{Between}12{Between}13.5")
    {
        private const char Between = ';';

        public override bool IsNumber => false;

        public override bool Holds(BsonValue value) => value.IsArray && value.AsArray.All(IsSize);

        public override string Format(BsonValue value) => string.Join(Between, value.AsArray.Select(static size => new Length(size.AsInt64).Format()));

        public override bool TryRead(string text, out BsonValue value)
        {
            BsonArray sizes = [];
            value = sizes;
            foreach (string part in text.Split(Between, StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries))
            {
                if (!TryReadSize(part, out BsonValue size))
                {
                    return false;
                }

                sizes.Add(size);
            }

            return true;
        }

        public override void WriteJson(Utf8JsonWriter json, BsonValue value)
        {
            json.WriteStartArray();
            foreach (BsonValue size in value.AsArray)
            {
                json.WriteRawValue(new Length(size.AsInt64).Format());
            }

            json.WriteEndArray();
        }
    }

    private sealed class AmountCell() : CellKind("a number from 0, such as 12.50")
    {
        public override bool Holds(BsonValue value) => value.IsDecimal && value.AsDecimal is >= 0 and <= 1_000_000_000;

        public override string Format(BsonValue value) => value.AsDecimal.ToString(CultureInfo.InvariantCulture);

        public override bool TryRead(string text, out BsonValue value)
        {
            bool isRead = decimal.TryParse(Pointed(text), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out decimal amount);
            value = amount;
            return isRead;
        }
    }

    private class NumberCell(string expected = "a number from 0, such as 0.35") : CellKind(expected)
    {
        public override bool Holds(BsonValue value) => value.IsDouble && value.AsDouble is >= 0 and <= 1e9;

        public override string Format(BsonValue value) => value.AsDouble.ToString("R", CultureInfo.InvariantCulture);

        public override bool TryRead(string text, out BsonValue value)
        {
            bool isRead = double.TryParse(Pointed(text), NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture, out double number);
            value = number;
            return isRead;
        }
    }

    private sealed class NumberOrNothingCell() : NumberCell("a number from 0, or nothing")
    {
        public override bool Holds(BsonValue value) => value.IsNull || base.Holds(value);

        public override string Format(BsonValue value) => value.IsNull ? "" : base.Format(value);

        public override bool TryRead(string text, out BsonValue value)
        {
            value = BsonValue.Null;
            return text.Length == 0 || base.TryRead(text, out value);
        }

        public override void WriteJson(Utf8JsonWriter json, BsonValue value)
        {
            if (value.IsNull)
            {
                json.WriteNullValue();
            }
            else
            {
                base.WriteJson(json, value);
            }
        }
    }

    private sealed class CountCell() : CellKind("a whole number from 0")
    {
        public override bool Holds(BsonValue value) => value.IsInt32 && value.AsInt32 >= 0;

        public override string Format(BsonValue value) => value.AsInt32.ToString(CultureInfo.InvariantCulture);

        public override bool TryRead(string text, out BsonValue value)
        {
            bool isRead = int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out int count);
            value = count;
            return isRead;
        }
    }

    private sealed class YesOrNoCell() : CellKind("yes or no")
    {
        public override bool IsNumber => false;

        public override bool Holds(BsonValue value) => value.IsBoolean;

        public override string Format(BsonValue value) => value.AsBoolean ? "yes" : "no";

        public override bool TryRead(string text, out BsonValue value)
        {
            value = text == "yes";
            return text is "yes" or "no";
        }

        public override void WriteJson(Utf8JsonWriter json, BsonValue value) => json.WriteBooleanValue(value.AsBoolean);
    }

    private static bool IsSize(BsonValue value) => value.IsInt64 && value.AsInt64 is >= 0 and <= 1_000_000 * Length.PicometresPerMillimetre;

    private static bool TryReadSize(string text, out BsonValue value)
    {
        Length size = default;
        bool isRead = DecimalText.TryRead(text, out ExactDecimal number, out int read) && read == text.Length && Length.TryFrom(number, LengthUnit.Millimetre, out size);
        value = size.Picometres;
        return isRead;
    }

    /// <summary>A spreadsheet may have written a decimal comma.</summary>
    private static string Pointed(string text) => text.Contains('.', StringComparison.Ordinal) ? text : text.Replace(',', '.');

    /// <summary>Half of a surrogate pair is no text and would not come back.</summary>
    private static bool IsWellFormed(string text)
    {
        for (int i = 0; i < text.Length; i++)
        {
            if (char.IsSurrogate(text[i]))
            {
                if (!char.IsSurrogatePair(text, i))
                {
                    return false;
                }

                i++;
            }
        }

        return true;
    }
}

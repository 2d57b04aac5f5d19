using System.Globalization;
using System.Text.Json;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Store.Tables;

internal abstract partial class CellKind
{
    private sealed class SizeCell() : CellKind<Length>("a size in mm, such as 25.012")
    {
        protected override bool Holds(Length value) => IsSize(value);

        protected override string Format(Length value) => value.Format();

        protected override bool TryRead(string text, out Length value) => TryReadSize(text, out value);

        protected override void Write(BinaryWriter target, Length value) => target.Write(value.Picometres);

        protected override Length Read(BinaryReader source) => new(source.ReadInt64());
    }

    private sealed class SizesCell() : CellKind<ValueList<Length>>($"sizes in mm parted by '{Between}', such as 10{Between}12{Between}13.5")
    {
        private const char Between = ';';

        public override bool IsNumber => false;

        protected override bool Holds(ValueList<Length> value) => value.All(IsSize);

        protected override string Format(ValueList<Length> value) => string.Join(Between, value.Select(static size => size.Format()));

        protected override bool TryRead(string text, out ValueList<Length> value)
        {
            List<Length> sizes = [];
            foreach (string part in text.Split(Between, StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries))
            {
                if (!TryReadSize(part, out Length size))
                {
                    value = [];
                    return false;
                }

                sizes.Add(size);
            }

            value = [.. sizes];
            return true;
        }

        protected override void WriteJson(Utf8JsonWriter json, ValueList<Length> value)
        {
            json.WriteStartArray();
            foreach (Length size in value)
            {
                json.WriteRawValue(size.Format());
            }

            json.WriteEndArray();
        }

        protected override void Write(BinaryWriter target, ValueList<Length> value)
        {
            target.Write7BitEncodedInt(value.Count);
            foreach (Length size in value)
            {
                target.Write(size.Picometres);
            }
        }

        protected override ValueList<Length> Read(BinaryReader source)
        {
            Length[] sizes = new Length[source.Read7BitEncodedInt()];
            for (int i = 0; i < sizes.Length; i++)
            {
                sizes[i] = new Length(source.ReadInt64());
            }

            return [.. sizes];
        }
    }

    private sealed class AmountCell() : CellKind<decimal>("a number from 0, such as 12.50")
    {
        protected override bool Holds(decimal value) => value is >= 0 and <= 1_000_000_000;

        protected override string Format(decimal value) => value.ToString(CultureInfo.InvariantCulture);

        protected override bool TryRead(string text, out decimal value) =>
            decimal.TryParse(Pointed(text), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out value);

        protected override void Write(BinaryWriter target, decimal value) => target.Write(value);

        protected override decimal Read(BinaryReader source) => source.ReadDecimal();
    }

    private sealed class NumberCell() : CellKind<double>("a number from 0, such as 0.35")
    {
        protected override bool Holds(double value) => IsNumberFromZero(value);

        protected override string Format(double value) => value.ToString("R", CultureInfo.InvariantCulture);

        protected override bool TryRead(string text, out double value) => TryReadNumber(text, out value);

        protected override void Write(BinaryWriter target, double value) => target.Write(value);

        protected override double Read(BinaryReader source) => source.ReadDouble();
    }

    private sealed class NumberOrNothingCell() : CellKind("a number from 0, or nothing")
    {
        public override bool Holds(object? value) => value is null || (value is double number && IsNumberFromZero(number));

        public override string Format(object? value) => value is double number ? number.ToString("R", CultureInfo.InvariantCulture) : "";

        public override bool TryRead(string text, out object? value)
        {
            bool isRead = TryReadNumber(text, out double number);
            value = isRead ? number : null;
            return isRead || text.Length == 0;
        }

        public override void WriteJson(Utf8JsonWriter json, object? value) => json.WriteRawValue(value is null ? "null" : Format(value));

        public override void WriteBinary(BinaryWriter target, object? value)
        {
            target.Write(value is not null);
            if (value is double number)
            {
                target.Write(number);
            }
        }

        public override object? ReadBinary(BinaryReader source) => source.ReadBoolean() ? source.ReadDouble() : null;
    }

    private sealed class CountCell() : CellKind<int>("a whole number from 0")
    {
        protected override bool Holds(int value) => value >= 0;

        protected override string Format(int value) => value.ToString(CultureInfo.InvariantCulture);

        protected override bool TryRead(string text, out int value) => int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out value);

        protected override void Write(BinaryWriter target, int value) => target.Write(value);

        protected override int Read(BinaryReader source) => source.ReadInt32();
    }

    private static bool IsSize(Length size) => size >= Length.Zero && size <= Length.FromMillimetres(1_000_000);

    private static bool TryReadSize(string text, out Length size)
    {
        size = default;
        return DecimalText.TryRead(text, out ExactDecimal number, out int read) && read == text.Length && Length.TryFrom(number, LengthUnit.Millimetre, out size);
    }

    private static bool IsNumberFromZero(double number) => number is >= 0 and <= 1e9;

    private static bool TryReadNumber(string text, out double number) =>
        double.TryParse(Pointed(text), NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture, out number);

    /// <summary>A spreadsheet may have written a decimal comma.</summary>
    private static string Pointed(string text) => text.Contains('.', StringComparison.Ordinal) ? text : text.Replace(',', '.');
}

using System.Text.Json;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Store.Tables;

internal abstract partial class CellKind
{
    private class TextCell(string expected, int most, bool mayBeEmpty) : CellKind<string>(expected)
    {
        public override bool IsFreeText => true;

        public override bool IsNumber => false;

        protected override bool Holds(string value) => value.Length <= most && (mayBeEmpty || !string.IsNullOrWhiteSpace(value)) && IsWellFormed(value);

        protected override string Format(string value) => value;

        protected override bool TryRead(string text, out string value)
        {
            value = text;
            return true;
        }

        protected override void WriteJson(Utf8JsonWriter json, string value) => json.WriteStringValue(value);

        protected override void Write(BinaryWriter target, string value) => target.Write(value);

        protected override string Read(BinaryReader source) => source.ReadString();
    }

    private sealed class OneOfCell(string[] words) : TextCell("one of " + string.Join(", ", words), int.MaxValue, mayBeEmpty: false)
    {
        public override bool IsFreeText => false;

        protected override bool Holds(string value) => words.Contains(value);
    }

    private sealed class WordsCell() : CellKind<ValueList<string>>($"words of at most 40 characters parted by '{Between}'")
    {
        private const char Between = ';';
        private const int Longest = 40;
        private const int Most = 50;

        public override bool IsFreeText => true;

        public override bool IsNumber => false;

        protected override bool Holds(ValueList<string> value) => value.Count <= Most && value.All(static word =>
            word.Length is > 0 and <= Longest && word.Trim() == word && !word.Contains(Between, StringComparison.Ordinal) && IsWellFormed(word));

        protected override string Format(ValueList<string> value) => string.Join(Between, value);

        protected override bool TryRead(string text, out ValueList<string> value)
        {
            value = text.Length == 0 ? [] : [.. text.Split(Between, StringSplitOptions.TrimEntries)];
            return true;
        }

        protected override void WriteJson(Utf8JsonWriter json, ValueList<string> value)
        {
            json.WriteStartArray();
            foreach (string word in value)
            {
                json.WriteStringValue(word);
            }

            json.WriteEndArray();
        }

        protected override void Write(BinaryWriter target, ValueList<string> value)
        {
            target.Write7BitEncodedInt(value.Count);
            foreach (string word in value)
            {
                target.Write(word);
            }
        }

        protected override ValueList<string> Read(BinaryReader source)
        {
            string[] words = new string[source.Read7BitEncodedInt()];
            for (int i = 0; i < words.Length; i++)
            {
                words[i] = source.ReadString();
            }

            return [.. words];
        }
    }

    private sealed class YesOrNoCell() : CellKind<bool>("yes or no")
    {
        public override bool IsNumber => false;

        protected override bool Holds(bool value) => true;

        protected override string Format(bool value) => value ? "yes" : "no";

        protected override bool TryRead(string text, out bool value)
        {
            value = text == "yes";
            return text is "yes" or "no";
        }

        protected override void WriteJson(Utf8JsonWriter json, bool value) => json.WriteBooleanValue(value);

        protected override void Write(BinaryWriter target, bool value) => target.Write(value);

        protected override bool Read(BinaryReader source) => source.ReadBoolean();
    }

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

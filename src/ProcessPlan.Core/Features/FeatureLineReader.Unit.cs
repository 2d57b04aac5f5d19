using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>Decides which unit behind a number is that of the whole line, and asks where inches may have been meant.</content>
internal ref partial struct FeatureLineReader
{
    /// <summary>
    /// A unit that stands alone, or behind the size, its deviations or its limits, is that of the line. One behind another length counts for that
    /// length only, unless the size is typed as sizes in inches are.
    /// </summary>
    private void DecideUnit()
    {
        for (int i = 0; i < _units.Count; i++)
        {
            if (IsOfLine(_units[i]))
            {
                NoteUnit(_units[i]);
            }
        }

        bool known = _unit.Is;
        bool inches = false;
        for (int i = 0; i < _units.Count; i++)
        {
            UnitNote note = _units[i];
            if (IsOfLine(note))
            {
                continue;
            }

            if (known)
            {
                RefuseRoughnessInOtherUnit(note);
            }
            else if (IsInchLike() || SizePlace is null)
            {
                // Inches before millimetres: "1/2 H7 cyl 0.01mm x 3/4in".
                _unit = !_unit.Is || note.Unit == LengthUnit.Inch ? new Noted<LengthUnit>(note.Unit, note.Place) : _unit;
            }
            else if (note.Unit == LengthUnit.Inch && !inches && SizePlace is { } size && !ProblemAt(note.Number.At))
            {
                inches = true;
                Report($"'{Show(note.Number)}' is in inches, but the size '{Show(size)}' has no unit.", note.Number, $"{Show(size)} mm or {Show(size)} in");
            }
        }
    }

    private void NoteUnit(UnitNote note)
    {
        if (!_unit.Is)
        {
            _unit = new Noted<LengthUnit>(note.Unit, note.Place);
        }
        else if (_unit.Value != note.Unit)
        {
            Report($"'{Show(note.Place)}' after '{Show(_unit.Place)}': the line has two units.", note.Place, "mm or in, the same in the whole line");
        }
    }

    /// <summary>Nobody gives roughness in inches or millimetres: a unit behind it was meant for the line.</summary>
    private void RefuseRoughnessInOtherUnit(UnitNote note)
    {
        if (_finish.Is && IsIn(note, _finish.Place))
        {
            NoteUnit(note);
        }
    }

    /// <summary>A unit that cannot belong to another length. One behind a hardness or a count stands alone.</summary>
    private readonly bool IsOfLine(UnitNote note) => note.IsAlone
        || (SizePlace is { } size && IsIn(note, size))
        || (_deviations.Is && IsIn(note, _deviations.Place))
        || (_hardness.Is && IsIn(note, _hardness.Place))
        || (_quantity.Is && IsIn(note, _quantity.Place))
        || IsBehindClass(note);

    /// <summary>"1 N7 in": behind letters that could also have been a roughness or a length.</summary>
    private readonly bool IsBehindClass(UnitNote note)
    {
        for (int i = 0; i < _classes.Count; i++)
        {
            ClassNote known = _classes[i];
            if (note.Number.At > known.Place.At && note.Number.At < known.Place.End)
            {
                return true;
            }
        }

        return false;
    }

    private static bool IsIn(UnitNote note, Place place) => note.Place.At >= place.At && note.Place.End <= place.End;

    private readonly Place? SizePlace => _limits.Is ? _limits.Place : _size?.Place;

    /// <summary>Whether the size is a fraction or begins with its point, as sizes in inches are typed.</summary>
    private readonly bool IsInchLike() => _limits.Is
        ? IsInchLike(_limits.Value.First) || IsInchLike(_limits.Value.Second)
        : _size is { } size && IsInchLike(size);

    private readonly bool IsInchLike(Measured number) => number.IsFraction || BeginsWithPoint(number);

    private readonly bool BeginsWithPoint(Measured number) => At(number.Place).TrimStart("+-−–—‐‑﹣－＋±/ \t\u00A0\u202F")[0] is '.' or ',';

    /// <summary>"hole .5 +.0005 -.0000" is typed as in inches, and finer than anything in millimetres.</summary>
    private void RefuseForgottenInches()
    {
        if (_units.Count > 0 || !_deviations.Is || _size is not { IsFraction: false, Unit: WrittenUnit.None } size)
        {
            return;
        }

        PairNote pair = _deviations.Value;
        if (pair.First.Unit != WrittenUnit.None || pair.Second.Unit != WrittenUnit.None)
        {
            return;
        }

        bool points = (pair.First.IsZero || BeginsWithPoint(pair.First)) && (pair.Second.IsZero || BeginsWithPoint(pair.Second));
        if (points && (BeginsWithPoint(size) || (!At(size.Place).StartsWith("0") && IsFinerThanAnyGrade(size, pair))))
        {
            Place place = size.Place.At < _deviations.Place.At ? size.Place.To(_deviations.Place) : _deviations.Place.To(size.Place);
            string millimetres = BeginsWithPoint(size) ? $"0{Show(size.Place)}" : $"{Show(size.Place)} mm";
            Report($"'{Show(place)}' has no unit; inches meant?", place, $"in behind the deviations, or {millimetres} for millimetres");
        }
    }

    /// <summary>Whether the tolerance in millimetres is finer than IT1.</summary>
    private static bool IsFinerThanAnyGrade(Measured size, PairNote pair)
    {
        if (!(size.TryLength(LengthUnit.Millimetre, out Length nominal) & pair.First.TryLength(LengthUnit.Millimetre, out Length first)
            & pair.Second.TryLength(LengthUnit.Millimetre, out Length second)))
        {
            return false;
        }

        Int128 width = Int128.Abs(((Int128)first.Picometres * pair.FirstSign) - ((Int128)second.Picometres * pair.SecondSign));
        return width > 0 && Iso286.TryWidth(nominal, ToleranceGrade.It(1), out Deviation finest) && width < finest.Picometres;
    }
}

using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>What belongs to a word: its roughness, its hardness, its name and range.</content>
internal ref partial struct FeatureLineReader
{
    private const int MostPieces = 1_000_000_000;

    private const string CoatingExpected = "such as coat zinc-nickel 8-12um";

    /// <summary>A hardness as written; a range has its end in <paramref name="To"/>.</summary>
    private readonly record struct HardnessNote(Measured Number, Measured? To, HardnessScale Scale, Place Place);

    private void TakeGeometry(FeatureWord word, Place place)
    {
        if (!TryMeasured(word, place, out Measured zone))
        {
            return;
        }

        GeometryKind kind = (GeometryKind)(word - FeatureWord.Cylindricity);
        for (int i = 0; i < _geometry.Count; i++)
        {
            GeometryNote known = _geometry[i];
            if (known.Kind == kind)
            {
                Report($"A second '{Show(place)}'.", place.To(zone.Place), "each form or position once");
                return;
            }
        }

        _geometry.Add(new GeometryNote(kind, zone));
    }

    private void NoteQuantity(Measured number, Place place)
    {
        if (!number.IsBareWhole || number.Number.Units is < 1 or > MostPieces)
        {
            Report($"'{Show(place)}' is no number of pieces.", place, "a whole number from 1, such as 200off");
            return;
        }

        Note(ref _quantity, (int)number.Number.Units, place, "number of pieces");
    }

    /// <summary>"Ra 0.8", "Ra&lt;0.8", "Ra 0.8 max": roughness is a greatest value, however it is said.</summary>
    private void TakeRoughness(FeatureWord word, Place place)
    {
        SkipSpaces();
        if (CharAt(_at) is '>' or '≥')
        {
            Report($"'{Show(place)}' asks for a least roughness.", place.To(new Place(_at, 1)), $"the greatest one, such as {Show(place)} {FeatureWords.Example(word)}");
            _at++;
        }
        else if (CharAt(_at) is '<' or '≤')
        {
            _at++;
        }

        if (TryMeasured(word, place, out Measured number))
        {
            _ = TrySuffix("max");
            Note(ref _finish, new FinishNote(word, number), PlaceFrom(place.At), "roughness");
        }
    }

    private bool TryScale(out HardnessScale scale)
    {
        scale = TrySuffix("hrc") ? HardnessScale.HRC : TrySuffix("hbw") || TrySuffix("hb") ? HardnessScale.HB : HardnessScale.HV;
        return scale != HardnessScale.HV || TrySuffix("hv");
    }

    /// <summary>"58HRC", "58-62 HRC", "HRC 58", "HRC58", "hrc=58".</summary>
    private bool TryHardness(out HardnessNote note)
    {
        Mark start = Here;
        int letters = _at;
        while (LetterAt(letters))
        {
            letters++;
        }

        FeatureWord word = FeatureWords.Find(_text[_at..letters]);
        bool scaleFirst = word is >= FeatureWord.Hrc and <= FeatureWord.Hv;
        HardnessScale scale = scaleFirst ? HardnessScale.HRC + (word - FeatureWord.Hrc) : default;
        if (scaleFirst)
        {
            _at = letters;
            SkipToValue();
        }

        if (NumberAt(_at) && TryNumber(out Measured number))
        {
            Measured? to = EndOfRange();
            if (scaleFirst || TryScale(out scale))
            {
                note = new HardnessNote(number, to, scale, PlaceFrom(start.At));
                return true;
            }
        }

        GoBack(start);
        note = default;
        return false;
    }

    private Measured? EndOfRange()
    {
        int second = SecondOfRange();
        _at = second < 0 ? _at : second;
        return second >= 0 && TryNumber(out Measured end) ? end : null;
    }

    /// <summary>The hardness, or null after telling why it is none that can be taken.</summary>
    private Hardness? Accept(HardnessNote note)
    {
        if (note.To is not null)
        {
            Report($"'{Show(note.Place)}' is a range; one hardness is taken.", note.Place,
                $"one value, such as {Show(note.Number.Place)}{note.Scale}");
            return null;
        }

        if (note.Number.IsBare && Hardness.TryCreate(note.Number.Number, note.Scale, out Hardness hardness))
        {
            return hardness;
        }

        Report($"'{Show(note.Place)}' is outside the scale.", note.Place, Hardness.RangeOf(note.Scale));
        return null;
    }

    private void NoteHardness(HardnessNote note)
    {
        if (Accept(note) is { } hardness)
        {
            Note(ref _hardness, hardness, note.Place, "hardness");
        }
    }

    private void TakeHardness(FeatureWord word, Place place)
    {
        if (word == FeatureWord.Hardness)
        {
            SkipToValue();
        }
        else
        {
            _at = place.At;
        }

        if (TryHardness(out HardnessNote note))
        {
            NoteHardness(note);
            return;
        }

        _at = Math.Max(_at, place.End);
        ReportNoHardness(place);
    }

    private void ReportNoHardness(Place word)
    {
        if (!NumberAt(_at))
        {
            string scale = FeatureWords.Find(At(word)) is >= FeatureWord.Hrc and <= FeatureWord.Hv ? "" : "HRC";
            Report($"'{Show(word)}' needs a hardness behind it.", word, $"a hardness, such as {Show(word)} 58{scale}");
        }
        else if (TryNumber(out Measured number))
        {
            _ = EndOfRange();
            Report($"'{Show(PlaceFrom(word.At))}' does not say its scale.", PlaceFrom(number.Place.At),
                $"{Show(number.Place)}HRC, {Show(number.Place)}HB or {Show(number.Place)}HV");
        }
    }

    /// <summary>"hardened 58HRC", "case 0.8", "case 0.8 58HRC", "nitrided 0.3".</summary>
    private void TakeTreatment(FeatureWord word, Place place)
    {
        SkipToValue();
        Measured? depth = null;
        Hardness? hardness = null;
        if (TryHardness(out HardnessNote asked))
        {
            hardness = Accept(asked);
        }
        else if (word == FeatureWord.Hardened)
        {
            ReportNoHardness(place);
        }
        else if (TryMeasured(word, place, out Measured deep))
        {
            depth = deep;
            hardness = HardnessOfCase();
        }

        if (depth is not null || hardness is not null)
        {
            Note(ref _treatment, new TreatmentNote(TreatmentKind.Hardened + (word - FeatureWord.Hardened), hardness, depth), PlaceFrom(place.At), "treatment");
        }
    }

    /// <summary>A hardness right behind the depth is that of the case if it is too hard to be the hardness as delivered.</summary>
    private Hardness? HardnessOfCase()
    {
        const double LeastHrc = 45;
        const double LeastOther = 450;
        Mark behindDepth = Here;
        SkipSpaces();
        if (TryHardness(out HardnessNote note) && note.Number.Number.ToDouble() >= (note.Scale == HardnessScale.HRC ? LeastHrc : LeastOther))
        {
            return Accept(note);
        }

        GoBack(behindDepth);
        return null;
    }

    /// <summary>"coat zinc-nickel 8-12um": a name of one or more words, then the least and the greatest build-up per surface.</summary>
    private void TakeCoating(Place word)
    {
        SkipToValue();
        Place name = TakeCoatingName();
        if (FeatureWords.Find(_text[_at..WordEnd(_at)]) is FeatureWord.Before or FeatureWord.After)
        {
            TakePart();
            SkipSpaces();
        }

        Mark behindName = Here;
        if (NumberAt(_at))
        {
            if (!TryNumber(out Measured least))
            {
                return;
            }

            if (EndOfRange() is { } most)
            {
                NoteCoating(word, name, least, most);
                return;
            }

            bool otherNumber = LetterAt(_at) || TryScale(out _) || TryPieces();
            if (!otherNumber)
            {
                Report($"'{Show(least.Place)}' is one thickness; a coating varies.", least.Place, "least and greatest build-up per surface, such as 8-12um");
                return;
            }

            GoBack(behindName);
        }

        Place said = name.Length > 0 ? word.To(name) : word;
        Report($"'{Show(said)}' needs {(name.Length > 0 ? "" : "a name and ")}its build-up per surface behind it.", said, CoatingExpected);
    }

    private void NoteCoating(Place word, Place name, Measured least, Measured most)
    {
        if (name.Length == 0)
        {
            Report($"'{Show(word)}' needs the name of the coating before its build-up.", word, CoatingExpected);
            return;
        }

        // Build-up is spoken in micrometres; only another written unit changes that.
        most = most.Unit == WrittenUnit.None ? most with { Unit = WrittenUnit.Micrometre } : most;
        least = least.Unit == WrittenUnit.None ? least with { Unit = most.Unit } : least;
        Note(ref _coating, new CoatingNote(At(name).ToString(), least, most), word.To(most.Place), "coating");
    }

    /// <summary>Words up to the first that is a number, a word of the line, a material or, behind the first word, has a digit.</summary>
    private Place TakeCoatingName()
    {
        int start = _at;
        int end = _at;
        while (!AtEnd && !NumberAt(_at) && Current != '=')
        {
            ReadOnlySpan<char> word = _text[_at..WordEnd(_at)];
            bool first = end == start;
            if (FeatureWords.Find(word) != FeatureWord.None || (!first && (word.ContainsAnyInRange('0', '9') || _materials.TryFind(word, out _))))
            {
                break;
            }

            end = WordEnd(_at);
            _at = end;
            SkipSeparators();
        }

        return new Place(start, end - start);
    }
}

using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Tui.Paper;

/// <summary>Writes lengths in the unit of the screen. Limits never grow by it: they are exact, or rounded into the metal that is allowed.</summary>
internal readonly record struct Ruler(LengthUnit Unit)
{
    private const int InchPlaces = 8;
    private const long PicometresPerInchPlace = Length.PicometresPerInch / 100_000_000; // 254 pm, exact

    /// <summary>
    /// The preferred values of Ra as drawings pair them, nanometres with microinches (ISO 1302 and ASME B46.1): a pair is one and the same requirement,
    /// though its two figures differ by up to two in a hundred.
    /// </summary>
    private static readonly Dictionary<long, long> RaPairs = new()
    {
        [25] = 1,
        [50] = 2,
        [100] = 4,
        [200] = 8,
        [400] = 16,
        [800] = 32,
        [1_600] = 63,
        [3_200] = 125,
        [6_300] = 250,
        [12_500] = 500,
        [25_000] = 1000,
        [50_000] = 2000,
    };

    private static readonly Length MicroInch = new(Length.PicometresPerMicroinch);
    private static readonly Length Tenth = new(Length.PicometresPerMillimetre / 10_000);
    private static readonly Length[] InchSteps = [new(2_540_000), new(254_000), new(25_400), new(2_540), new(254)];

    public bool IsInch => Unit == LengthUnit.Inch;

    public string Name => IsInch ? "in" : "mm";

    /// <summary>Limits with at least three decimals in millimetres, four in inches; in inches rounded inwards to four where they are not exact.</summary>
    public (string Max, string Min) Limits(SizeWindow window)
    {
        SizeWindow shown = Shown(window, out _);
        return (Format(shown.Max), Format(shown.Min));
    }

    /// <summary>The same for a table: millimetres too are rounded inwards, to four decimals.</summary>
    public string Range(SizeWindow window)
    {
        SizeWindow narrow = IsInch ? window : window.RoundInward(Tenth) ?? window;
        (string max, string min) = Limits(narrow);
        return $"{min}-{max}";
    }

    /// <summary>A size to aim at, never outside the limits as they are shown.</summary>
    public string Aim(Length aim, SizeWindow window)
    {
        SizeWindow shown = Shown(window, out Length step);
        Length near = IsInch ? aim.RoundNearest(step) : aim;
        return Format(near < shown.Min ? shown.Min : near > shown.Max ? shown.Max : near);
    }

    /// <summary>A length by itself, without trailing zeros; in inches rounded to the nearest ten-thousandth where it is not exact.</summary>
    public string Plain(Length length) => IsInch
        ? DecimalText.Format((length.Picometres % MicroInch.Picometres == 0 ? length : length.RoundNearest(InchSteps[0])).Picometres / PicometresPerInchPlace, InchPlaces)
        : length.Format();

    /// <summary>The least metal downwards and the most upwards, to three decimals of a millimetre or four of an inch.</summary>
    public string Stock(Stock least, Stock most)
    {
        Length step = IsInch ? InchSteps[0] : new Length(Length.PicometresPerMicrometre);
        return $"{Format(new Length(least.Picometres).RoundDown(step))}-{Format(new Length(most.Picometres).RoundUp(step))}";
    }

    /// <summary>An upper deviation downwards, with its unit.</summary>
    public string Upper(Deviation deviation) => Signed(deviation, up: false);

    /// <summary>A lower deviation upwards, with its unit.</summary>
    public string Lower(Deviation deviation) => Signed(deviation, up: true);

    /// <summary>The extreme clearances of a fit, negative where it grips; in inches rounded outwards, so that neither is left out.</summary>
    public string Clearances(Fit fit)
    {
        string least = IsInch ? Signed(fit.MinClearance, up: false) : fit.MinClearance.ToString();
        string most = IsInch ? Signed(fit.MaxClearance, up: true) : fit.MaxClearance.ToString();
        return $"{least[..least.LastIndexOf(' ')]} to {most}";
    }

    /// <summary>A coating's least and most thickness, in µm or µin with its unit.</summary>
    public string Coat(Length least, Length most) => IsInch
        ? $"{least.RoundDown(MicroInch).Picometres / MicroInch.Picometres}-{most.RoundUp(MicroInch).Picometres / MicroInch.Picometres} µin"
        : $"{(least - Length.Zero).Format()}-{(most - Length.Zero).Format()} µm";

    /// <summary>A tolerance downwards, with its unit.</summary>
    public string Width(Deviation width) => Signed(width, up: false).TrimStart('+');

    /// <summary>Roughness in µm, or in µin, without its unit: a preferred Ra by its pair, what was asked in whole µin as asked, all else downwards.</summary>
    public string Ra(Roughness roughness)
    {
        if (!IsInch)
        {
            return DecimalText.Format(roughness.Nanometres, 3);
        }

        if (roughness.IsRa && RaPairs.TryGetValue(roughness.Nanometres, out long paired))
        {
            return DecimalText.Format(paired, 0);
        }

        // Held to the nanometre below, a whole number of microinches is still told by it: 32 µin are held as 812 nm.
        long whole = (roughness.Nanometres * 1000 + Length.PicometresPerMicroinch - 1) / Length.PicometresPerMicroinch;
        if (whole * Length.PicometresPerMicroinch / 1000 == roughness.Nanometres)
        {
            return DecimalText.Format(whole, 0);
        }

        long tenths = roughness.Nanometres * 100_000 / Length.PicometresPerMicroinch / 10; // 1 nm = 1000 pm
        return tenths >= 100 ? DecimalText.Format(tenths / 10, 0) : DecimalText.Format(tenths, 1);
    }

    public string RaUnit => IsInch ? "µin" : "µm";

    private string Signed(Deviation deviation, bool up)
    {
        if (!IsInch)
        {
            return deviation.ToString();
        }

        Length length = new(deviation.Picometres);
        bool exact = length.Picometres % MicroInch.Picometres == 0;
        Length shown = exact ? length : up ? length.RoundUp(InchSteps[1]) : length.RoundDown(InchSteps[1]);
        return shown == Length.Zero ? "0 in" : (shown.Picometres > 0 ? "+" : "") + Format(shown) + " in";
    }

    private SizeWindow Shown(SizeWindow window, out Length step)
    {
        step = MicroInch;
        if (!IsInch || (window.Min.Picometres % step.Picometres == 0 && window.Max.Picometres % step.Picometres == 0))
        {
            return window;
        }

        foreach (Length finer in InchSteps)
        {
            if (window.RoundInward(finer) is { } inside && (inside.Min < inside.Max || window.Min == window.Max))
            {
                step = finer;
                return inside;
            }
        }

        // Narrower than 500 pm: no tolerance of this trade, but then the exact middle is the honest figure.
        Length middle = window.Middle.RoundNearest(step = InchSteps[^1]);
        return new SizeWindow(middle, middle);
    }

    private string Format(Length length) => IsInch ? DecimalText.Format(length.Picometres / PicometresPerInchPlace, InchPlaces, 4) : length.Format(3);
}

using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>Why ISO 286-1 gives nothing for a tolerance class at a nominal size.</summary>
public enum ClassGap
{
    /// <summary>The class is defined at the size.</summary>
    None,

    /// <summary>The size is not over 0 up to and including 3150 mm.</summary>
    SizeOutside,

    /// <summary>The grade is not given at the size: IT01 and IT0 over 500 mm, IT14 to IT18 up to 1 mm.</summary>
    GradeNotAtSize,

    /// <summary>The letter is not given at the size, in no grade.</summary>
    LetterNotAtSize,

    /// <summary>The letter is given at the size, but not in this grade.</summary>
    LetterNotInGrade,

    /// <summary>A hole K to ZC over 3 up to 500 mm, finer than IT3: the standard prints no Δ for it.</summary>
    NoDelta,
}

/// <summary>The limit deviations of a tolerance class at a nominal size, or why the standard gives none.</summary>
public readonly record struct ClassLookup
{
    private ClassLookup(Deviation upper, Deviation lower, ClassGap gap)
    {
        Upper = upper;
        Lower = lower;
        Gap = gap;
    }

    public bool IsDefined => Gap == ClassGap.None;

    /// <summary>Why there is nothing; <see cref="ClassGap.None"/> where the class is defined.</summary>
    public ClassGap Gap { get; }

    /// <summary>Upper limit deviation (ES, es), exact; zero where the class is not defined.</summary>
    public Deviation Upper { get; }

    /// <summary>Lower limit deviation (EI, ei), exact; zero where the class is not defined.</summary>
    public Deviation Lower { get; }

    public Deviation Width => Upper - Lower;

    /// <summary>The limits of size at the nominal size that was looked up.</summary>
    /// <exception cref="InvalidOperationException">The class is not defined.</exception>
    public SizeWindow LimitsAt(Length nominal) => IsDefined
        ? new SizeWindow(nominal + Lower, nominal + Upper)
        : throw new InvalidOperationException($"A class that is not defined ({Gap}) has no limits of size.");

    internal static ClassLookup Refused(ClassGap gap) => new(default, default, gap);

    internal static ClassLookup FromUpper(long upper, long width) => new(new Deviation(upper), new Deviation(upper - width), ClassGap.None);

    internal static ClassLookup FromLower(long lower, long width) => new(new Deviation(lower + width), new Deviation(lower), ClassGap.None);
}

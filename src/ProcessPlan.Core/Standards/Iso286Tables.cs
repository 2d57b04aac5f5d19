using ProcessPlan.Core.Values;
using static ProcessPlan.Core.Standards.FundamentalDeviation;

namespace ProcessPlan.Core.Standards;

/// <summary>The printed tables of ISO 286-1 as arrays of picometres, read once.</summary>
internal static class Iso286Tables
{
    /// <summary>A cell in which the standard gives nothing.</summary>
    public const long NotGiven = long.MinValue;

    public static readonly PublishedTable Grades = PublishedTable.Load("iso286-1-table1.txt");

    private static readonly PublishedTable ShaftsAToJ = PublishedTable.Load("iso286-1-table4.txt");
    private static readonly PublishedTable ShaftsKToZC = PublishedTable.Load("iso286-1-table5.txt");
    private static readonly PublishedTable HolesOfJ = PublishedTable.Load("iso286-1-table2-j.txt");

    /// <summary>Upper ends of the main steps, which tolerances go by.</summary>
    public static readonly long[] MainEnds = Column(Grades, "upto", Length.PicometresPerMillimetre);

    /// <summary>Upper ends of the sub-steps, which fundamental deviations go by.</summary>
    public static readonly long[] SubEnds = Column(ShaftsAToJ, "upto", Length.PicometresPerMillimetre);

    /// <summary>The main step of each sub-step.</summary>
    public static readonly int[] MainOfSub = MainSteps();

    /// <summary>Widths by grade, then main step.</summary>
    public static readonly long[][] Widths = ReadWidths();

    /// <summary>Fundamental deviations of shafts with their signs by letter, then sub-step; js has none.</summary>
    public static readonly long[][] Shafts = ReadShafts();

    /// <summary>Lower limit deviations of the shafts j by grade, then sub-step; null for a grade that j has not.</summary>
    public static readonly long[]?[] ShaftsJ =
        ByGrade((5, ShaftsAToJ, "j5-6"), (6, ShaftsAToJ, "j5-6"), (7, ShaftsAToJ, "j7"), (8, ShaftsAToJ, "j8"));

    /// <summary>Upper limit deviations of the holes J by grade, then sub-step; null for a grade that J has not.</summary>
    public static readonly long[]?[] HolesJ = ByGrade((6, HolesOfJ, "J6"), (7, HolesOfJ, "J7"), (8, HolesOfJ, "J8"));

    /// <summary>The step that holds <paramref name="size"/>, its upper end included; -1 where none does.</summary>
    public static int StepOf(long[] ends, long size)
    {
        if (size <= 0 || size > ends[^1])
        {
            return -1;
        }

        int low = 0;
        int high = ends.Length - 1;
        while (low < high)
        {
            int middle = (low + high) / 2;
            if (size <= ends[middle])
            {
                high = middle;
            }
            else
            {
                low = middle + 1;
            }
        }

        return low;
    }

    private static long[][] ReadWidths()
    {
        long[][] widths = new long[ToleranceGrade.Count][];
        for (int ordinal = 0; ordinal < widths.Length; ordinal++)
        {
            ToleranceGrade grade = ToleranceGrade.At(ordinal);
            bool inMillimetres = grade >= ToleranceGrade.It(12);
            widths[ordinal] = Column(Grades, grade.Text, inMillimetres ? Length.PicometresPerMillimetre : Length.PicometresPerMicrometre);
        }

        return widths;
    }

    private static long[][] ReadShafts()
    {
        long[][] shafts = new long[ToleranceClass.Letters.Length][];
        for (FundamentalDeviation letter = A; letter <= ZC; letter++)
        {
            string name = new ToleranceClass(letter, IsInternal: false, ToleranceGrade.IT01).LetterText;
            shafts[(int)letter] = letter switch
            {
                JS => [],
                J => Column(ShaftsAToJ, "j7"),
                < JS => Column(ShaftsAToJ, name),
                _ => Column(ShaftsKToZC, name),
            };
        }

        return shafts;
    }

    private static long[]?[] ByGrade(params (int Grade, PublishedTable Table, string Column)[] columns)
    {
        long[]?[] byGrade = new long[]?[ToleranceGrade.Count];
        foreach ((int grade, PublishedTable table, string column) in columns)
        {
            byGrade[ToleranceGrade.It(grade).Ordinal] = Column(table, column);
        }

        return byGrade;
    }

    private static int[] MainSteps()
    {
        int[] steps = new int[SubEnds.Length];
        for (int i = 0; i < steps.Length; i++)
        {
            steps[i] = StepOf(MainEnds, SubEnds[i]);
        }

        return steps;
    }

    private static long[] Column(PublishedTable table, string column, long unit = Length.PicometresPerMicrometre)
    {
        long[] cells = new long[table.Rows.Count];
        for (int row = 0; row < cells.Length; row++)
        {
            cells[row] = table.Rows[row].IsEmpty(column) ? NotGiven : (long)(table.Rows[row].Decimal(column) * unit);
        }

        return cells;
    }
}

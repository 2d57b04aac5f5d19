using System.Reflection;

namespace ProcessPlan.Core.Tests.Values;

/// <summary>The contract of a value that can be compared: equality, hash, ordering, operators and the default, in one call.</summary>
internal static class OrderedValues
{
    private static readonly (string Name, Func<int, bool> Holds)[] Operators =
    [
        ("op_Equality", static order => order == 0),
        ("op_Inequality", static order => order != 0),
        ("op_LessThan", static order => order < 0),
        ("op_LessThanOrEqual", static order => order <= 0),
        ("op_GreaterThan", static order => order > 0),
        ("op_GreaterThanOrEqual", static order => order >= 0),
    ];

    /// <param name="zero">What the default must equal.</param>
    /// <param name="ascending">Makes different values anew at each call, the smallest first.</param>
    public static void ShouldHoldTheContract<T>(T zero, Func<T[]> ascending)
        where T : struct, IComparable<T>, IEquatable<T>
    {
        zero.Should().Be(default(T), "the default is the zero");
        (T[] values, T[] again) = (ascending(), ascending());
        for (int i = 0; i < values.Length; i++)
        {
            values[i].GetHashCode().Should().Be(again[i].GetHashCode());
            values[i].Equals((object?)null).Should().BeFalse();
            values[i].Equals(new object()).Should().BeFalse();
            for (int j = 0; j < values.Length; j++)
            {
                int order = i.CompareTo(j);
                values[i].Equals(again[j]).Should().Be(order == 0, "{0} and {1}", values[i], again[j]);
                values[i].Equals((object)again[j]).Should().Be(order == 0);
                Math.Sign(values[i].CompareTo(again[j])).Should().Be(order, "{0} and {1}", values[i], again[j]);
                foreach ((string name, Func<int, bool> holds) in Operators)
                {
                    MethodInfo apply = typeof(T).GetMethod(name, [typeof(T), typeof(T)])
                        ?? throw new MissingMethodException(typeof(T).Name, name);
                    apply.Invoke(null, [values[i], again[j]]).Should().Be(holds(order), "{0}({1}, {2})", name, values[i], again[j]);
                }
            }
        }
    }
}

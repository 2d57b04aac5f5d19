using CsCheck;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public sealed class ValueListTests
{
    [Fact]
    public void Equals_AnyTwoLists_IsEqualityOfTheirItems() => Gen.Select(Gen.Int[0, 2].Array[0, 3], Gen.Int[0, 2].Array[0, 3]).Sample(static (a, b) =>
    {
        ValueList<int> left = [.. a];
        ValueList<int> right = [.. b];
        bool same = a.SequenceEqual(b);
        left.Equals(right).Should().Be(same);
        left.Equals((object)right).Should().Be(same);
        if (same)
        {
            left.GetHashCode().Should().Be(right.GetHashCode());
        }
    });

    [Fact]
    public void New_SourceChangedLater_StaysTheSame()
    {
        int[] source = [1, 2];
        ValueList<int> list = [.. source];
        source[0] = 9;
        list.Should().Equal(1, 2);
        list.Count.Should().Be(2);
        list[1].Should().Be(2);
        list.ToString().Should().Be("1, 2");
        list.Equals(null).Should().BeFalse();
    }
}

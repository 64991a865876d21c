using HeadToWatts.Memos.Sections;

namespace HeadToWatts.Memos.Tests.Sections;

public class RoundToSumTests
{
    [Fact]
    public void Thirds_still_add_up()
    {
        Assert.Equal([33.4, 33.3, 33.3], RoundToSum.Of([100 / 3.0, 100 / 3.0, 100 / 3.0], 0.1).Select(p => Math.Round(p, 6)));
    }

    [Fact]
    public void Parts_add_up_to_the_rounded_whole_and_none_is_off_by_a_step()
    {
        var random = new Random(3);
        for (var round = 0; round < 500; round++)
        {
            var parts = Enumerable.Range(0, random.Next(1, 12)).Select(_ => random.NextDouble() * 1000).ToArray();
            var shown = RoundToSum.Of(parts, 1);
            Assert.Equal(Math.Round(parts.Sum(), MidpointRounding.AwayFromZero), shown.Sum(), 6);
            Assert.All(shown.Zip(parts), p => Assert.InRange(Math.Abs(p.First - p.Second), 0, 1));
        }
    }
}

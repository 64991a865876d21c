using HeadToWatts.Web.Hosting;

namespace HeadToWatts.Web.Tests.Hosting;

public sealed class LocalHostTests
{
    [Theory]
    [InlineData("http://127.0.0.1:5080", "localhost 127.0.0.1 [::1]")]
    [InlineData("http://0.0.0.0:80;http://*:81;http://[::]:82", "localhost 127.0.0.1 [::1]")]
    [InlineData("http://planner.example:5080", "localhost 127.0.0.1 [::1] planner.example")]
    public void The_names_answered_are_the_loopback_names_and_those_listened_on(string urls, string names) =>
        Assert.Equal(names.Split(' '), LocalHost.NamesOf(urls));
}

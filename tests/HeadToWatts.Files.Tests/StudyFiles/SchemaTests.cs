using System.Text.Json;
using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using Json.Schema;

namespace HeadToWatts.Files.Tests.StudyFiles;

public class SchemaTests
{
    private static readonly JsonSchema Schema = JsonSchema.FromText(File.ReadAllText(Repository.Path("docs", "study.schema.json")));

    [Fact]
    public void Every_demonstration_site_follows_the_published_schema()
    {
        foreach (var site in DemoSites.All)
            Assert.True(IsValid(site.StudyText()), site.Id);
    }

    [Fact]
    public void A_study_written_by_the_program_follows_the_schema()
    {
        foreach (var site in DemoSites.All)
            Assert.True(IsValid(StudyFileWriter.Write(site.Load())), site.Id);
    }

    [Theory]
    [InlineData("\"gross\": \"60 ft\"", "\"gros\": \"60 ft\"")]
    [InlineData("\"gross\": \"60 ft\"", "\"gross\": 60")]
    [InlineData("\"gross\": \"60 ft\"", "\"gross\": \"60\"")]
    [InlineData("\"units\": \"US\"", "\"units\": \"metric\"")]
    [InlineData("\"format\": 1", "\"format\": 2")]
    public void The_schema_refuses_what_the_reader_refuses(string old, string replacement)
    {
        var text = Samples.With(old, replacement);
        Assert.False(IsValid(text));
        Assert.NotEmpty(Samples.Problems(text));
    }

    [Fact]
    public void The_schema_accepts_the_sample_that_the_reader_accepts() => Assert.True(IsValid(Samples.Good));

    private static bool IsValid(string text)
    {
        using var json = JsonDocument.Parse(text);
        return Schema.Evaluate(json.RootElement).IsValid;
    }
}

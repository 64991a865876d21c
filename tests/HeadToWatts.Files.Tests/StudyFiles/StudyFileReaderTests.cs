using HeadToWatts.Files.StudyFiles;

namespace HeadToWatts.Files.Tests.StudyFiles;

public class StudyFileReaderTests
{
    [Fact]
    public void A_good_study_becomes_an_input_in_SI()
    {
        var alternative = Samples.Input(Samples.Good).Alternatives[0];
        // By hand: 60 ft x 0.3048; 24 in x 0.0254; 22 cfs x 0.028316846592.
        Assert.Equal(18.288, alternative.Head.Gross.Metres, 10);
        Assert.Equal(0.6096, alternative.Waterway.Elements[0].InsideDiameterM, 12);
        Assert.Equal(0.622970625024, alternative.Flow.DesignFlowM3PerS!.Value, 10);
        Assert.Equal(10.0, alternative.Site.WaterTemperatureDegC, 10);
        Assert.Equal(0.8, alternative.Waterway.Elements[0].Fittings[1].LossCoefficient * alternative.Waterway.Elements[0].Fittings[1].Count, 12);
        Assert.Empty(alternative.Assumptions);
    }

    [Theory]
    [InlineData("\"gross\": \"60 ft\"", "\"gros\": \"60 ft\"", "alternatives[0].head.gros", "perhaps 'gross' was meant")]
    [InlineData("\"gross\": \"60 ft\"", "\"gross\": 60", "alternatives[0].head.gross", "a bare number has no unit")]
    [InlineData("\"gross\": \"60 ft\"", "\"gross\": \"60\"", "alternatives[0].head.gross", "the unit is missing")]
    [InlineData("\"gross\": \"60 ft\"", "\"gross\": \"60 psi\"", "alternatives[0].head.gross", "measures a pressure")]
    [InlineData("\"gross\": \"60 ft\"", "\"gross\": \"6,5 ft\"", "alternatives[0].head.gross", "the comma")]
    [InlineData("\"gross\": \"60 ft\"", "\"gross\": \"-3 ft\"", "alternatives[0].head.gross", "outside what is possible")]
    [InlineData("\"gross\": \"60 ft\"", "\"gross\": \"60 ft\", \"headwater\": \"100 ft\", \"tailwater\": \"40 ft\"", "alternatives[0].head", "both given")]
    [InlineData("\"gross\": \"60 ft\"", "\"headwater\": \"40 ft\", \"tailwater\": \"100 ft\"", "alternatives[0].head.tailwater", "headwater less tailwater")]
    [InlineData("\"10 %\"", "\"110 %\"", "alternatives[0].flow.curve[0].exceeded", "outside what is possible")]
    [InlineData("\"flow\": \"20 cfs\"", "\"flow\": \"80 cfs\"", "alternatives[0].flow.curve", "")]
    [InlineData("\"flow\": \"20 cfs\"", "\"flow\": \"566 L/s\"", "alternatives[0].flow.curve", "mix units")]
    [InlineData("\"flow\": \"20 cfs\"", "\"flow\": \"-20 cfs\"", "alternatives[0].flow.curve[1].flow", "outside what is possible")]
    [InlineData("\"material\": \"PVC\"", "\"material\": \"PVD\"", "alternatives[0].waterway.elements[0].material", "perhaps 'PVC' was meant")]
    [InlineData("\"fitting\": \"Entrance, rounded\"", "\"fitting\": \"Entrance, roundet\"", "alternatives[0].waterway.elements[0].fittings[0].fitting", "perhaps 'Entrance, rounded' was meant")]
    [InlineData("\"type\": \"suggest\"", "\"type\": \"Kaplann\"", "alternatives[0].turbine.type", "perhaps 'Kaplan' was meant")]
    [InlineData("\"units\": \"US\"", "\"units\": \"metric\"", "units", "in which units")]
    [InlineData("\"format\": 1", "\"format\": 7", "format", "reads formats 1 to 1")]
    [InlineData("\"format\": 1,", "", "format", "missing")]
    [InlineData("\"name\": \"Sample\"", "\"name\": \"Sample\", \"name\": \"Twice\"", "name", "stands here twice")]
    [InlineData("\"reservedFlow\": \"2 cfs\"", "\"reservedFlow\": \"2 cfs\", \"season\": \"Apr 1 to Oct 1\"", "alternatives[0].flow.rowsAreFor", "season's days or the whole year's")]
    public void A_wrong_field_is_named_with_what_was_read_and_why(string old, string replacement, string where, string why)
    {
        var problems = Samples.Problems(Samples.With(old, replacement));
        Assert.Contains(problems, p => p.Where.StartsWith(where, StringComparison.Ordinal) && p.Why.Contains(why, StringComparison.Ordinal));
    }

    [Fact]
    public void All_problems_are_told_together()
    {
        var text = Samples.With("\"60 ft\"", "\"60\"")
            .Replace("\"24 in\"", "\"wide\"", StringComparison.Ordinal)
            .Replace("\"40 cfs\"", "\"40 buckets\"", StringComparison.Ordinal)
            .Replace("\"92 %\"", "\"192 %\"", StringComparison.Ordinal);
        Assert.Equal(4, Samples.Problems(text).Count);
    }

    [Theory]
    [InlineData("")]
    [InlineData("   ")]
    [InlineData("{")]
    [InlineData("[]")]
    [InlineData("null")]
    [InlineData("\"text\"")]
    [InlineData("{\"format\":1,\"alternatives\":[{\"flow\":3}]}")]
    [InlineData("{\"format\":1,\"alternatives\":{}}")]
    public void What_is_not_a_study_is_refused_with_a_reason(string text) => Assert.NotEmpty(Samples.Problems(text));

    [Fact]
    public void A_broken_file_names_its_line()
    {
        var problem = Assert.Single(StudyFileReader.Parse("sample.json", Samples.With("\"units\": \"US\",", "\"units\": US,")).Problems);
        Assert.Equal("line 4", problem.Where);
    }

    [Fact]
    public void A_file_above_one_megabyte_is_refused_by_name()
    {
        using var stream = new MemoryStream(new byte[StudyFileReader.LargestBytes + 1]);
        var problem = Assert.Single(StudyFileReader.Read("big.json", stream).Problems);
        Assert.Equal("big.json", problem.Where);
    }

    [Fact]
    public void Cutting_a_study_short_anywhere_ends_in_problems_never_in_a_crash()
    {
        for (var length = 0; length < Samples.Good.Length - 2; length += 3)
            Assert.NotEmpty(Samples.Problems(Samples.Good[..length]));
    }

    [Fact]
    public void Writing_and_reading_again_gives_the_same_study()
    {
        var first = StudyFileReader.Parse("sample.json", Samples.Good).Value;
        var text = StudyFileWriter.Write(first);
        var second = StudyFileReader.Parse("again.json", text).Value;
        Assert.Equal(text, StudyFileWriter.Write(second));
        Assert.Equal("60 ft", second.Alternatives[0].Head.Gross);
        Assert.Equal(22 * 0.028316846592, StudyBuilder.Build(second, NoFlowFiles.Instance).Value.Alternatives[0].Flow.DesignFlowM3PerS!.Value, 12);
    }

    [Fact]
    public void What_is_left_out_is_assumed_aloud()
    {
        var assumptions = Samples.Input(Samples.With("\"latitude\": \"44 deg\", ", "")).Alternatives[0].Assumptions;
        Assert.Equal(["The latitude is not given; 45 deg is assumed."], assumptions);
    }
}

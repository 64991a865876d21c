using HeadToWatts.Basis.Problems;
using HeadToWatts.Web.Sessions;
using HeadToWatts.Web.Worksheet.Stages;

namespace HeadToWatts.Web.Tests.Sessions;

public sealed class FieldNamesTests
{
    [Theory]
    [InlineData("alternatives[0].waterway.elements[1].insideDiameter", "waterway, pipe 2, inside diameter")]
    [InlineData("alternatives[0].flow.curve[0].exceeded", "flow, row 1, percent exceeded")]
    [InlineData("name", "name")]
    [InlineData("flow.csv: row 12", "flow.csv: row 12")]
    [InlineData("line 3", "line 3")]
    public void A_place_in_a_study_file_is_told_in_the_words_of_the_screen(string where, string words) =>
        Assert.Equal(words, FieldNames.Of(where));

    [Theory]
    [InlineData("alternatives[0].flow.season", "flow")]
    [InlineData("alternatives[0].flow.designFlow", "energy")]
    [InlineData("alternatives[0].site.gridFrequency", "turbine")]
    [InlineData("alternatives[0].site.latitude", "head")]
    [InlineData("alternatives[0].losses.line", "energy")]
    [InlineData("name", "memo")]
    public void A_problem_is_counted_at_the_stage_that_holds_its_field(string where, string stage) =>
        Assert.Equal(stage, StageDefinitions.Of(new Problem(where, "", "why")).Key);
}

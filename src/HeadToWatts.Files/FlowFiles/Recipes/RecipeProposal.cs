namespace HeadToWatts.Files.FlowFiles.Recipes;

/// <summary>Why a choice of a proposed recipe was made.</summary>
/// <param name="Field">Field of the recipe document, as in "dateOrder".</param>
/// <param name="Text">The evidence in words.</param>
public sealed record RecipeEvidence(string Field, string Text);

/// <summary>A choice that the file does not decide and the user must.</summary>
/// <param name="Field">Field of the recipe document.</param>
/// <param name="Text">The question.</param>
/// <param name="Choices">What can be chosen; empty where anything can be entered.</param>
public sealed record RecipeQuestion(string Field, string Text, IReadOnlyList<string> Choices);

/// <summary>A recipe proposed for a file, with the evidence for its choices and the questions that remain.</summary>
/// <param name="Recipe">The recipe; what is asked is left open in it.</param>
/// <param name="Evidence">Why.</param>
/// <param name="Questions">What the user must decide.</param>
public sealed record RecipeProposal(ReadingRecipe Recipe, IReadOnlyList<RecipeEvidence> Evidence, IReadOnlyList<RecipeQuestion> Questions)
{
    /// <summary>True when nothing remains to be asked.</summary>
    public bool IsDecided => Questions.Count == 0;
}

using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using Microsoft.AspNetCore.Components;

namespace HeadToWatts.Web.Fields;

/// <summary>
/// A field for a quantity. It accepts any unit of its dimension; a bare number is in the shown unit. The value it hands on is
/// the text as typed with its unit, and only when it can be read: what cannot be read stays in the field with the reason
/// beside it, and the last good text stays where it was.
/// </summary>
public partial class QuantityField : ComponentBase
{
    private bool _focused;
    private string? _typed;
    private string? _handedOn;
    private string? _ownProblem;

    /// <summary>Label as the user reads it.</summary>
    [Parameter, EditorRequired] public string Label { get; set; } = "";

    /// <summary>Identity of the input in the page; unique there.</summary>
    [Parameter, EditorRequired] public string Id { get; set; } = "";

    /// <summary>The stored text, with its unit; null or empty when nothing is entered.</summary>
    [Parameter] public string? Text { get; set; }

    /// <summary>Told the new text to store; null when an optional field was emptied.</summary>
    [Parameter] public EventCallback<string?> TextChanged { get; set; }

    /// <summary>The unit shown, and that of a number without one.</summary>
    [Parameter, EditorRequired] public UnitOfMeasure Unit { get; set; } = UnitTable.Metre;

    /// <summary>True when the field may be left empty.</summary>
    [Parameter] public bool Optional { get; set; }

    /// <summary>What holds when nothing is entered, shown in the empty field.</summary>
    [Parameter] public string? Placeholder { get; set; }

    /// <summary>A line under the field.</summary>
    [Parameter] public string? Hint { get; set; }

    /// <summary>What the study found wrong with the stored text.</summary>
    [Parameter] public Problem? Problem { get; set; }

    private string? Wrong => _ownProblem ?? (Problem is null ? null : Says(Problem));

    private string Shown
    {
        get
        {
            if (_typed is not null)
                return _typed;
            if (string.IsNullOrWhiteSpace(Text))
                return "";
            return Read(Text).TryGet(out var held) ? FieldText.ToShow(Text, held, Unit) : Text;
        }
    }

    private bool HidesUnit => FieldText.HasUnit(Shown) && (Shown.Length > 0 || _typed is not null);

    private string? Title => _typed is null && !string.IsNullOrWhiteSpace(Text) && FieldText.HasUnit(Text) && Text.Trim() != Shown + " " + Unit.Symbol
        ? "entered as " + Text.Trim()
        : null;

    private string Also => Read(_typed ?? Text).TryGet(out var held) ? FieldText.AlsoUnderstood(held, Unit.Dimension, Unit) : "";

    private string DescribedBy
    {
        get
        {
            var ids = Id + "-unit";
            if (Wrong is not null)
                return ids + " " + Id + "-wrong";
            return Hint is null ? ids : ids + " " + Id + "-hint";
        }
    }

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        // A text that came from elsewhere (another study, a file) replaces what was typed here.
        if (_typed is not null && !_focused && !string.Equals(Text, _handedOn, StringComparison.Ordinal) && _ownProblem is null)
            _typed = null;
    }

    private async Task TypedAsync(ChangeEventArgs change)
    {
        _typed = change.Value?.ToString() ?? "";
        if (string.IsNullOrWhiteSpace(_typed))
        {
            _ownProblem = null;
            if (Optional)
                await HandOnAsync(null);
            return;
        }

        var read = Read(_typed);
        if (read.IsGood)
        {
            _ownProblem = null;
            await HandOnAsync(FieldText.ToStore(_typed, Unit));
        }
        else
        {
            // "5.5 f" is on its way to "5.5 ft": no alarm before the hand is off the keys.
            _ownProblem = FieldText.IsUnfinished(_typed, Unit.Dimension) ? null : Says(read.Problems[0]);
        }
    }

    private Task HandOnAsync(string? text)
    {
        _handedOn = text;
        return TextChanged.InvokeAsync(text);
    }

    private void Enter() => _focused = true;

    private void Leave()
    {
        _focused = false;
        if (_typed is null)
            return;
        var read = Read(_typed);
        if (read.IsGood || (Optional && string.IsNullOrWhiteSpace(_typed)))
        {
            _typed = null;
            _ownProblem = null;
        }
        else
        {
            _ownProblem = Says(read.Problems[0]);
        }
    }

    private Checked<double> Read(string? text) => QuantityText.Read(text, Unit.Dimension, Unit, Label);

    private static string Says(Problem problem)
    {
        if (string.IsNullOrWhiteSpace(problem.Read))
            return "Nothing is entered yet.";
        var why = problem.Why.Length == 0 ? "this is refused" : char.ToUpperInvariant(problem.Why[0]) + problem.Why[1..];
        return problem.Accepted.Length == 0 ? why + "." : $"{why}. Accepted: {problem.Accepted}.";
    }
}

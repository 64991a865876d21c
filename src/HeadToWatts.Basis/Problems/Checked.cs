using System.Diagnostics.CodeAnalysis;

namespace HeadToWatts.Basis.Problems;

/// <summary>Either a value or every problem found; never half of each.</summary>
/// <typeparam name="T">Type of the value.</typeparam>
public sealed class Checked<T>
{
    private readonly T? _value;

    internal Checked(T value) => _value = value;

    internal Checked(IReadOnlyList<Problem> problems)
    {
        if (problems.Count == 0)
            throw new ArgumentException("A refusal needs at least one problem.", nameof(problems));
        Problems = problems;
    }

    /// <summary>Every problem; empty when there is a value.</summary>
    public IReadOnlyList<Problem> Problems { get; } = [];

    /// <summary>True when there is a value.</summary>
    public bool IsGood => Problems.Count == 0;

    /// <summary>The value.</summary>
    /// <exception cref="InvalidOperationException">The input was refused.</exception>
    public T Value => IsGood ? _value! : throw new InvalidOperationException("The input was refused: " + Problems[0]);

    /// <summary>Gives the value, if there is one.</summary>
    public bool TryGet([MaybeNullWhen(false)] out T value)
    {
        value = _value;
        return IsGood;
    }

    /// <summary>Gives the value if there is one; otherwise adds the problems to the list.</summary>
    public bool TryGet(ICollection<Problem> problems, [MaybeNullWhen(false)] out T value)
    {
        ArgumentNullException.ThrowIfNull(problems);
        foreach (var problem in Problems)
            problems.Add(problem);
        value = _value;
        return IsGood;
    }

    /// <summary>Applies a function to the value.</summary>
    public Checked<TOut> Then<TOut>(Func<T, TOut> map)
    {
        ArgumentNullException.ThrowIfNull(map);
        return IsGood ? new Checked<TOut>(map(_value!)) : new Checked<TOut>(Problems);
    }
}

/// <summary>Makes checked values.</summary>
public static class Checked
{
    /// <summary>A good value.</summary>
    public static Checked<T> Of<T>(T value) => new(value);

    /// <summary>A refusal with one problem.</summary>
    public static Checked<T> Refused<T>(Problem problem) => new([problem]);

    /// <summary>A refusal with all its problems.</summary>
    public static Checked<T> Refused<T>(IEnumerable<Problem> problems) => new([.. problems]);
}

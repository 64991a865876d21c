using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>The problems of one file. A file wrong in every row is told so by its first fifty and a count.</summary>
internal sealed class ProblemList(string file)
{
    private const int MostListed = 50;
    private readonly List<Problem> _listed = [];
    private int _more;

    public bool Any => _listed.Count > 0;

    public void Row(int row, string read, string why, string accepted = "") =>
        Add(RowProblem(row, read, why, accepted));

    public Problem RowProblem(int row, string read, string why, string accepted) =>
        new($"{file} row {row.ToString(CultureInfo.InvariantCulture)}", Shorten(read), why, accepted);

    public void File(string read, string why, string accepted = "") => Add(new Problem(file, Shorten(read), why, accepted));

    public void Add(Problem problem)
    {
        if (_listed.Count < MostListed)
            _listed.Add(problem);
        else
            _more++;
    }

    public Checked<FlowFile> Refuse()
    {
        if (_more > 0)
            _listed.Add(new Problem(file, $"{_more.ToString("N0", CultureInfo.InvariantCulture)} more problems", "only the first fifty are listed"));
        _more = 0;
        return Checked.Refused<FlowFile>(_listed);
    }

    private static string Shorten(string read) => read.Length <= 80 ? read : read[..80] + "...";
}

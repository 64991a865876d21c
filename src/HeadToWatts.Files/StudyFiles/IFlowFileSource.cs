using HeadToWatts.Basis.Problems;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Gives the daily record that a study names by file.</summary>
public interface IFlowFileSource
{
    /// <summary>Reads the record.</summary>
    /// <param name="record">What the study says of the file.</param>
    /// <param name="where">Field that names it, for problems.</param>
    Checked<DailyRecord> Read(RecordDocument record, string where);
}

/// <summary>No flow files at hand: a study that names one is asked to bring it.</summary>
public sealed class NoFlowFiles : IFlowFileSource
{
    /// <summary>The one instance.</summary>
    public static NoFlowFiles Instance { get; } = new();

    /// <inheritdoc/>
    public Checked<DailyRecord> Read(RecordDocument record, string where)
    {
        ArgumentNullException.ThrowIfNull(record);
        return Checked.Refused<DailyRecord>(new Problem(where, record.File ?? "", "the study points to a flow file that is not at hand; open that file on the Flow page", "the flow file itself"));
    }
}

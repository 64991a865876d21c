using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Files.FlowFiles;

/// <summary>One kind of flow file: recognise it, read it.</summary>
public interface IFlowFileFormat
{
    /// <summary>Key, lower-case words with hyphens.</summary>
    string Id { get; }

    /// <summary>Name, as messages and lists show it.</summary>
    string Name { get; }

    /// <summary>Whether the opening lines are of this kind.</summary>
    bool Recognises(FlowFileHead head);

    /// <summary>Reads the file, or lists every problem in it.</summary>
    Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, CancellationToken cancellation);
}

using HeadToWatts.Basis.Problems;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Cli;

/// <summary>Where the commands read and write.</summary>
internal sealed record Terminal(TextWriter Output, TextWriter Error, Func<Stream> OpenInput)
{
    /// <summary>Opens a file, or standard input for "-"; null after saying why not.</summary>
    internal Stream? Open(string path)
    {
        try
        {
            return path == "-" ? OpenInput() : File.OpenRead(path);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or NotSupportedException)
        {
            Error.WriteLine($"{path}: (file): (nothing): it cannot be opened: {e.Message}");
            return null;
        }
    }

    internal void Tell(string file, IEnumerable<Problem> problems)
    {
        var name = file == "-" ? "(standard input)" : file;
        foreach (var problem in problems)
            Error.WriteLine($"{name}: {problem}");
    }

    /// <summary>Reads a study with its flow files, or tells every problem and gives null.</summary>
    internal StudyInput? Study(string path)
    {
        using var stream = Open(path);
        if (stream is null)
            return null;
        var document = StudyFileReader.Read(path, stream);
        if (!document.IsGood)
        {
            Tell(path, document.Problems);
            return null;
        }

        var folder = path == "-" ? "." : Path.GetDirectoryName(Path.GetFullPath(path))!;
        var input = StudyBuilder.Build(document.Value, FolderFlowFiles.In(folder));
        if (input.IsGood)
            return input.Value;
        Tell(path, input.Problems);
        return null;
    }

    /// <summary>Writes a file whole; says why when that fails.</summary>
    internal bool Write(string path, Action<string> write)
    {
        try
        {
            write(path);
            return true;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or NotSupportedException or ArgumentException)
        {
            Error.WriteLine($"{path}: (file): (nothing): it cannot be written: {e.Message}");
            return false;
        }
    }
}

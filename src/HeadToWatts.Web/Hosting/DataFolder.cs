using HeadToWatts.Storage;

namespace HeadToWatts.Web.Hosting;

/// <summary>Where the web app keeps its studies: "--data FOLDER", or the user's application data.</summary>
internal static class DataFolder
{
    public static string From(IConfiguration configuration)
    {
        var named = configuration["data"];
        return string.IsNullOrWhiteSpace(named) ? StoreFolder.Default() : Path.GetFullPath(named);
    }
}

using System.Diagnostics;
using System.Globalization;
using System.Text;
using HeadToWatts.Economics.CashFlows;

namespace HeadToWatts.Calculations.Tests.Economics.CashFlows;

/// <summary>The functions of a spreadsheet as an independent check, where LibreOffice is installed.</summary>
public class SpreadsheetTests
{
    [SkippableFact]
    public void The_spreadsheet_finds_the_same_values()
    {
        var office = Environment.GetEnvironmentVariable("PATH")!.Split(Path.PathSeparator).SelectMany(p => new[] { Path.Combine(p, "soffice"), Path.Combine(p, "libreoffice") }).FirstOrDefault(File.Exists);
        Skip.If(office is null, "LibreOffice is not installed");
        var flows = CashFlow.Of(Plans.Rich with { Tax = null }).ProjectAmounts.ToArray();
        var list = string.Join(";", flows.Skip(1).Select(Plain));
        var row = $"{{{string.Join(";", flows.Select(Plain))}}}";
        string[] formulas =
        [
            $"of:=NPV(0.06;{list})+({Plain(flows[0])})",
            $"of:=IRR({row};0.05)",
            $"of:=MIRR({row};0.06;0.06)",
            "of:=-PMT(0.07;15;250000)",
        ];
        double[] ours =
        [
            PresentWorth.OfFlows(flows, 0.06),
            RateOfReturn.Of(flows).Rates.MinBy(r => Math.Abs(r - 0.05)),
            RateOfReturn.Modified(flows, 0.06, 0.06)!.Value,
            new Loan(250_000, 0.07, 15).PaymentAmount,
        ];
        var theirs = Calculate(office!, formulas);
        for (var i = 0; i < formulas.Length; i++)
            Assert.Equal(theirs[i], ours[i], Math.Abs(ours[i]) * 1e-7);

        static string Plain(double value) => value.ToString("R", CultureInfo.InvariantCulture);
    }

    private static double[] Calculate(string office, string[] formulas)
    {
        var folder = Directory.CreateTempSubdirectory("headtowatts-sheet-").FullName;
        try
        {
            var cells = new StringBuilder();
            foreach (var formula in formulas)
                cells.Append(CultureInfo.InvariantCulture, $"<table:table-row><table:table-cell table:formula=\"{System.Security.SecurityElement.Escape(formula)}\" office:value-type=\"float\"/></table:table-row>");
            File.WriteAllText(Path.Combine(folder, "sheet.fods"), "<?xml version=\"1.0\"?><office:document xmlns:office=\"urn:oasis:names:tc:opendocument:xmlns:office:1.0\" xmlns:table=\"urn:oasis:names:tc:opendocument:xmlns:table:1.0\" xmlns:of=\"urn:oasis:names:tc:opendocument:xmlns:of:1.2\" office:version=\"1.2\" office:mimetype=\"application/vnd.oasis.opendocument.spreadsheet\"><office:body><office:spreadsheet><table:table table:name=\"a\">" + cells + "</table:table></office:spreadsheet></office:body></office:document>");
            using var process = Process.Start(new ProcessStartInfo(office)
            {
                ArgumentList = { "-env:UserInstallation=file://" + folder + "/profile", "--headless", "--convert-to", "csv:Text - txt - csv (StarCalc):44,34,76,1,,1033,false,false", "--outdir", folder, Path.Combine(folder, "sheet.fods") },
            })!;
            process.WaitForExit();
            return [.. File.ReadAllLines(Path.Combine(folder, "sheet.csv")).Select(l => double.Parse(l.Trim('"'), CultureInfo.InvariantCulture))];
        }
        finally
        {
            Directory.Delete(folder, true);
        }
    }
}

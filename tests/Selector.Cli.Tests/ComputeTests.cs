using System.Diagnostics;

namespace Selector.Cli.Tests;

/// <summary>The verb as it is used: files in, files out, by the built program.</summary>
public sealed class ComputeTests : IDisposable
{
    private const string RectifierHead = "id,arrangement,diode_model,load_type,f_line_hz,v_sec_rms_v,rw_ohm,lk_henry,vf0_v,rd_ohm,c_farad,esr_ohm,load_i_a,load_r_ohm,load_p_w,info_note";

    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("selector-cli");

    public void Dispose() => _folder.Delete(true);

    // Computed by hand: ten 10 ohm ±5 % at 1 A; one low and nine high, 113.65 mW; all high, 1.05 W.
    [Fact]
    public void A_bank_is_computed_exactly()
    {
        var row = Only(Compute("bank", "id,n_parallel,r_each_ohm,tol_frac,drive,i_total_a\nA,10,10,0.05,current,1\n"));

        Assert.Equal(0.11365, Number(row["p_one_worst_w"]), 5);
        Assert.Equal(1.05, Number(row["p_total_worst_w"]), 9);
        Assert.Equal("", row["error"]);
    }

    [Fact]
    public void Given_and_info_columns_are_carried_through_and_computed_ones_replaced()
    {
        var row = Only(Compute("rectifier", RectifierHead + ",vdc_mean_v\nR1,bridge,pwl,cr,50,12,0.5,0,0.7,0.1,0.001,0,,40,,\"a, b\",99\n"));

        Assert.Equal("a, b", row["info_note"]);
        Assert.Equal("0", row["collapses"]);
        Assert.InRange(Number(row["vdc_mean_v"]), 12, 15);
    }

    [Fact]
    public void Power_that_the_source_cannot_carry_is_a_result_with_empty_figures()
    {
        var row = Only(Compute("rectifier", RectifierHead + "\nR1,bridge,pwl,cp,60,6.3,8.662,0,0.75,0.549,0.0003914,0.84,,,0.5738,\n"));

        Assert.Equal("1", row["collapses"]);
        Assert.Equal("", row["vdc_mean_v"]);
        Assert.Equal("", row["error"]);
    }

    [Fact]
    public void A_row_that_cannot_be_solved_says_why_and_the_others_are_done()
    {
        var rows = Compute("converter", "id,f_sw_hz,v_in_v,duty,l_henry,c_farad,load_type,load_i_a\nA,abc,24,0.4,1e-4,1e-4,ci,1\nB,1e5,24,0.4,1e-4,1e-4,ci,1\nC,1e5,24,0.4,,1e-4,ci,1\n");

        Assert.StartsWith("f_sw_hz: 'abc' is no number", rows[0]["error"], StringComparison.Ordinal);
        Assert.Equal("", rows[1]["error"]);
        Assert.Equal("ccm", rows[1]["mode_observed"]);
        Assert.StartsWith("l_henry: is empty", rows[2]["error"], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("toaster", "is no kind")]
    [InlineData("bank", "Could not find")]
    public void A_wrong_call_ends_with_one_sentence_and_no_trace(string kind, string expected)
    {
        var (code, text) = Run("compute", kind, Path.Combine(_folder.FullName, "none.csv"), "--out", Path.Combine(_folder.FullName, "out.csv"));

        Assert.Equal(1, code);
        Assert.Contains(expected, text, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", text, StringComparison.Ordinal);
    }

    private List<Dictionary<string, string>> Compute(string kind, string cases)
    {
        var (input, output) = (Path.Combine(_folder.FullName, "cases.csv"), Path.Combine(_folder.FullName, "results.csv"));
        File.WriteAllText(input, cases);
        var (code, text) = Run("compute", kind, input, "--out", output);
        Assert.True(code == 0, text);
        var lines = File.ReadAllLines(output).Select(Cells).ToList();
        return [.. lines.Skip(1).Select(cells => lines[0].Zip(cells).ToDictionary(x => x.First, x => x.Second))];
    }

    private static Dictionary<string, string> Only(List<Dictionary<string, string>> rows) => Assert.Single(rows);

    private static (int Code, string Text) Run(params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet", [Path.Combine(AppContext.BaseDirectory, "Selector.Cli.dll"), .. arguments])
        {
            RedirectStandardOutput = true, RedirectStandardError = true,
        };
        using var process = Process.Start(start)!;
        var errors = process.StandardError.ReadToEndAsync();
        var text = process.StandardOutput.ReadToEnd() + errors.Result;
        process.WaitForExit();
        return (process.ExitCode, text);
    }

    /// <summary>RFC 4180, one line.</summary>
    private static string[] Cells(string line)
    {
        var cells = new List<string> { "" };
        var quoted = false;
        foreach (var c in line)
        {
            if (c == '"')
            {
                quoted = !quoted;
            }
            else if (c == ',' && !quoted)
            {
                cells.Add("");
            }
            else
            {
                cells[^1] += c;
            }
        }

        return [.. cells];
    }

    private static double Number(string text) => double.Parse(text, System.Globalization.CultureInfo.InvariantCulture);
}

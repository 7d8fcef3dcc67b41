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

    // Computed with ngspice 39 (table of switch-on cases, F2-02): 25.68 A in the first pulse at 90 degrees.
    [Fact]
    public void Switch_on_is_computed_at_a_phase_and_at_the_worst()
    {
        const string Head = "id,arrangement,load_type,f_line_hz,v_sec_rms_v,rw_ohm,lk_henry,vf0_v,rd_ohm,c_farad,esr_ohm,load_r_ohm,phase_kind,phase_deg\n";
        const string Circuit = "bridge,cr,50,12,0.3671,0.0001487,0.7,0.05,0.006133,0.0311,15.57";

        var rows = Compute("inrush", $"{Head}A,{Circuit},ninety,90\nB,{Circuit},worst,\nC,{Circuit},ninety,\n");

        Assert.Equal(25.68, Number(rows[0]["i_first_peak_a"]), 0.01);
        Assert.InRange(Number(rows[1]["phase_deg"]), 60, 90);
        Assert.True(Number(rows[1]["i_peak_any_a"]) > Number(rows[0]["i_peak_any_a"]));
        Assert.Contains("phase_deg", rows[2]["error"], StringComparison.Ordinal);
    }

    // Computed with ngspice 39 (table of hold-up cases, F9-03).
    [Fact]
    public void Hold_up_is_computed()
    {
        var row = Only(Compute("holdup", "id,arrangement,f_line_hz,v_sec_rms_v,rw_ohm,lk_henry,vf0_v,rd_ohm,c_farad,esr_ohm,load_p_w,v_uvlo_v\nA,centretap,50,13.5,0.4373,0.0005886,0.6,0.025,0.01377,0.0185,31.44,11\n"));

        Assert.Equal(0.0194749654, Number(row["t_ride_from_removal_s"]), 1e-6);
        Assert.Equal("1", row["survives_missed_halfcycle"]);
    }

    // Computed with ngspice 39 (table of converters on a reservoir, F4-02).
    [Fact]
    public void A_converter_on_its_reservoir_is_computed()
    {
        var row = Only(Compute("reservoir",
            "id,control,arrangement,f_line_hz,v_sec_rms_v,rw_ohm,lk_henry,vf0_v,rd_ohm,c_farad,esr_ohm,f_sw_hz,duty,vset_v,v_sat_v,r_on_ohm,buck_vf0_v,buck_rd_ohm,l_henry,dcr_ohm,cout_farad,cout_esr_ohm,load_i_a\n"
            + "A,fixed,bridge,50,24,0.7396,0,0.75,0.0674,0.002912,0.109,50000,0.42,,0,0.08,0.45,0.03,0.000267,0.05,0.00033,0.04,1.5\n"));

        Assert.Equal(1.32295732, Number(row["i_cap_rms_a"]), 0.005);
    }

    // Computed with ngspice 39 (table of rectifiers, F1-62).
    [Fact]
    public void A_rectifier_with_exponential_diodes_is_computed()
    {
        var row = Only(Compute("rectifier", "id,arrangement,diode_model,load_type,f_line_hz,v_sec_rms_v,rw_ohm,lk_henry,d_is_a,d_n,d_rs_ohm,c_farad,esr_ohm,load_i_a\nA,halfwave,shockley,ci,60,18,0.3411,0.0008305,6.088e-09,1.7,0.0329,0.009465,0.0125,0.945\n"));

        Assert.Equal(20.3984742, Number(row["vdc_mean_v"]), 1e-3);
    }

    [Fact]
    public void A_supply_is_assessed_as_table_and_as_json()
    {
        var file = Path.Combine(_folder.FullName, "supply.json");
        File.WriteAllText(file, """{"version":1,"name":"Trial","texts":{"source":"dc","output.voltage":"5 V","fit.U1":"Corvane|SD40-3","fit.C1":"Nobody|XYZ"}}""");

        var (code, table) = Run("assess", file);
        var (_, json) = Run("assess", file, "--json");

        Assert.Equal(0, code);
        Assert.Contains("input voltage", table, StringComparison.Ordinal);
        Assert.Contains("Nobody|XYZ is not in the catalogue", table, StringComparison.Ordinal);
        using var read = System.Text.Json.JsonDocument.Parse(json);
        var rows = read.RootElement.GetProperty("rows").EnumerateArray().ToList();
        Assert.Contains(rows, r => r.GetProperty("position").GetString() == "U1" && r.GetProperty("kind").GetString() == "input-voltage" && r.GetProperty("verdict").GetString() == "holds");
    }

    [Theory]
    [InlineData("{", "cannot be read")]
    [InlineData("""{"version":2,"name":"x","texts":{}}""", "version")]
    public void What_is_no_supply_is_refused_in_words(string text, string expected)
    {
        var file = Path.Combine(_folder.FullName, "supply.json");
        File.WriteAllText(file, text);

        var (code, words) = Run("assess", file);

        Assert.Equal(1, code);
        Assert.Contains(expected, words, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", words, StringComparison.Ordinal);
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

using System.Globalization;
using System.Net;
using System.Text.Json;

namespace BladeLog.Tests.Features.Workings;

/// <summary>Bodies that each working answers, as raw JSON by field, to be changed one field at a time.</summary>
internal static class Bodies
{
    public static Dictionary<string, string> Of(string working) => working switch
    {
        "band-life" => new()
        {
            ["thickness_mm"] = "0.64",
            ["wheels_mm"] = "[356, 356]",
            ["band_speed_m_s"] = "15",
            ["loop_mm"] = "2360",
            ["tension_mpa"] = "100",
            ["body_hrc"] = "46",
        },
        "tension" => new()
        {
            ["thickness_mm"] = "0.64",
            ["width_mm"] = "13",
            ["gullet_mm"] = "1.8",
            ["wheel_load_n"] = "1434",
        },
        "thrust-limits" => new()
        {
            ["width_mm"] = "25",
            ["thickness_mm"] = "0.9",
            ["gullet_mm"] = "5",
            ["tension_mpa"] = "100",
            ["guide_span_mm"] = "200",
            ["cut_height_mm"] = "150",
        },
        "cut" => new()
        {
            ["width_mm"] = "20",
            ["thickness_mm"] = "0.6",
            ["kerf_mm"] = "1.1",
            ["pitch_mm"] = "8.5",
            ["gullet_mm"] = "3",
            ["tooth_form"] = "\"hook\"",
            ["rake_deg"] = "20",
            ["tip"] = "\"set\"",
            ["edge_radius_um"] = "10",
            ["loop_mm"] = "3000",
            ["band_speed_m_s"] = "16",
            ["cut_height_mm"] = "150",
            ["density12_kg_m3"] = "520",
            ["moisture_pct"] = "12",
            ["feed_m_min"] = "2",
        },
        _ => throw new ArgumentOutOfRangeException(nameof(working), working, "There is no such working."),
    };

    public static Dictionary<string, string> With(this Dictionary<string, string> body, string field, string? raw)
    {
        var changed = new Dictionary<string, string>(body);
        if (raw is null)
        {
            changed.Remove(field);
        }
        else
        {
            changed[field] = raw;
        }

        return changed;
    }

    public static Dictionary<string, string> With(this Dictionary<string, string> body, string field, double value) =>
        body.With(field, value.ToString("R", CultureInfo.InvariantCulture));

    public static string Text(this Dictionary<string, string> body) =>
        "{" + string.Join(",", body.Select(f => $"\"{f.Key}\":{f.Value}")) + "}";

    /// <summary>The answer to a body that must be answered.</summary>
    public static async Task<JsonElement> Ask(this ShopApp app, string working, Dictionary<string, string> body)
    {
        using var answer = await app.PostText($"/api/v1/workings/{working}", body.Text());
        var text = await answer.Content.ReadAsStringAsync();
        Assert.True(answer.StatusCode == HttpStatusCode.OK, $"{(int)answer.StatusCode}: {text}");
        return await ShopApp.Json(answer);
    }

    /// <summary>The number at a path such as "gullet.median_bends" or "bending_mpa.0".</summary>
    public static double Number(this JsonElement answer, string path)
    {
        foreach (var step in path.Split('.'))
        {
            answer = int.TryParse(step, out var at) ? answer[at] : answer.GetProperty(step);
        }

        return answer.GetDouble();
    }

    public static void Near(double expected, double actual, double relative) =>
        Assert.True(Math.Abs(actual - expected) <= relative * Math.Abs(expected), $"Expected {expected:R}, answered {actual:R}.");
}

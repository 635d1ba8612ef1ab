using System.Net;
using AngleSharp.Dom;

namespace BladeLog.Tests.Features.Import;

/// <summary>What a bare number means under a heading that names a unit, or is one.</summary>
public sealed class HeadingUnitsTests(SampleShopApp shop) : IClassFixture<SampleShopApp>
{
    // 25.4 mm in an inch, over the teeth; points per inch are one more than teeth per inch.
    [Theory]
    [InlineData("tpi", "3", "8.467 mm")]
    [InlineData("TPI", "14", "1.814 mm")]
    [InlineData("Tpi", "3-4", "6.35-8.467 mm")]
    [InlineData("TPI", "3/4", "6.35-8.467 mm")]
    [InlineData("teeth per inch", "3", "8.467 mm")]
    [InlineData("Teeth", "4", "6.35 mm")]
    [InlineData("Pitch (TPI)", "3", "8.467 mm")]
    [InlineData("Pitch, teeth per inch", "3", "8.467 mm")]
    [InlineData("pitch_tpi", "2-3", "8.467-12.7 mm")]
    [InlineData("TPI (printed)", "3", "8.467 mm")]
    [InlineData("PPI", "4", "8.467 mm")]
    [InlineData("TPI", "8.5 mm", "8.5 mm")]
    [InlineData("Pitch", "8.5", "8.5 mm")]
    [InlineData("Pitch (in)", "7/8", "22.225 mm")]
    public async Task A_heading_that_is_a_unit_decides_what_its_bare_numbers_mean(string heading, string cell, string understood)
    {
        (HttpStatusCode status, IDocument page) = await ImportTests.Look(shop.App, $"tag;width;thickness;{heading};loop\nB-71;13;0.65;{cell};2667\n");
        Assert.True(status == HttpStatusCode.OK, SampleApp.Text(page.QuerySelector("main")));
        Assert.Equal(["2", "B-71", "13 mm", "0.65 mm", understood], page.QuerySelector("tbody tr")!.Children.Take(5).Select(SampleApp.Text));
    }

    // 15,000 psi are 103.42 MPa.
    [Theory]
    [InlineData("psi", "15000", "103.4 MPa")]
    [InlineData("Tension psi", "15000", "103.4 MPa")]
    [InlineData("MPa", "120", "120 MPa")]
    [InlineData("Strain (psi)", "15000", "103.4 MPa")]
    public async Task A_tension_column_takes_the_unit_of_its_heading(string heading, string cell, string understood)
    {
        (HttpStatusCode status, IDocument page) = await ImportTests.Look(shop.App, $"tag;width;thickness;tpi;{heading}\nB-71;13;0.65;3;{cell}\n");
        Assert.True(status == HttpStatusCode.OK, SampleApp.Text(page.QuerySelector("main")));
        Assert.Equal(understood, SampleApp.Text(page.QuerySelector("tbody tr")!.Children[5]));
    }

    [Theory]
    [InlineData("Width in", "1/2", "12.7 mm")]
    [InlineData("Width (inches)", "0.5", "12.7 mm")]
    [InlineData("Width, mm", "13", "13 mm")]
    public async Task A_width_column_takes_the_unit_of_its_heading(string heading, string cell, string understood)
    {
        (HttpStatusCode status, IDocument page) = await ImportTests.Look(shop.App, $"tag;{heading};thickness;tpi\nB-71;{cell};0.65;3\n");
        Assert.True(status == HttpStatusCode.OK, SampleApp.Text(page.QuerySelector("main")));
        Assert.Equal(understood, SampleApp.Text(page.QuerySelector("tbody tr")!.Children[2]));
    }
}

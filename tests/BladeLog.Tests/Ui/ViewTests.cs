using BladeLog.Ui;
using Microsoft.AspNetCore.Components.Rendering;

namespace BladeLog.Tests.Ui;

public class ViewTests
{
    [Fact]
    public void A_page_is_sent_whole_with_its_own_status()
    {
        var chrome = new Chrome("Shop", "JP", null, null);
        var answer = Html.View<Sentence, string>("Q-01 is dull", chrome, 422);
        Assert.Equal(422, answer.StatusCode);
        Assert.True(answer.PreventStreamingRendering);
        Assert.Equal(typeof(Sentence), answer.ComponentType);
        Assert.Equal("Q-01 is dull", answer.Parameters["Model"]);
        Assert.Same(chrome, answer.Parameters["Chrome"]);
    }

    [Fact]
    public void A_view_encodes_what_it_is_given() =>
        Assert.Equal("&lt;b&gt;5&#xA0;mm&lt;/b&gt;", Rendered.Html<Sentence>(("Model", "<b>5\u00a0mm</b>"), ("Chrome", Chrome.Bare)));

    private sealed class Sentence : View<string>
    {
        protected override void BuildRenderTree(RenderTreeBuilder builder) => builder.AddContent(0, Model);
    }
}

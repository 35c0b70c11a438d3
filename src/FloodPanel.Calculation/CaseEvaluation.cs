using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Guides;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Posts;

namespace FloodPanel.Calculation;

/// <summary>
/// One load case of an opening in numbers only, without working. The same object may be filled again and again
/// for models with the same counts of logs and bays; filling it allocates nothing, a post with a raker excepted.
/// </summary>
public sealed class CaseEvaluation
{
    private readonly FactoredLoad[] logLoads;
    private readonly LogResponse[] logs;
    private readonly PostResponse[] posts;

    /// <summary>Makes room for an opening.</summary>
    /// <param name="logCount">Logs in a stack [-].</param>
    /// <param name="bayCount">Bays [-].</param>
    public CaseEvaluation(int logCount, int bayCount)
    {
        logLoads = new FactoredLoad[logCount];
        logs = new LogResponse[logCount * bayCount];
        posts = new PostResponse[bayCount - 1];
    }

    /// <summary>The pressure of the case over the height of the barrier.</summary>
    public PressureDiagram Diagram { get; } = new();

    /// <summary>Line load of each log, the lowest first; the same in each bay [N/m].</summary>
    public ReadOnlySpan<FactoredLoad> LogLoads => logLoads;

    /// <summary>The logs, bay by bay from left to right, the lowest log first.</summary>
    public ReadOnlySpan<LogResponse> Logs => logs;

    /// <summary>The posts from left to right.</summary>
    public ReadOnlySpan<PostResponse> Posts => posts;

    /// <summary>The guide of the first bay.</summary>
    public GuideResponse LeftGuide { get; private set; }

    /// <summary>The guide of the last bay.</summary>
    public GuideResponse RightGuide { get; private set; }

    /// <summary>Calculates a load case.</summary>
    /// <param name="model">An opening with as many logs and bays as this object has room for.</param>
    /// <param name="kind">The case, one of the model's.</param>
    /// <exception cref="ArgumentException">The opening has other counts of logs or bays.</exception>
    public void Fill(OpeningModel model, CaseKind kind)
    {
        if (model.LogCount != logLoads.Length || model.PostCount != posts.Length)
        {
            throw new ArgumentException("has other counts of logs or bays than there is room for", nameof(model));
        }

        CaseDiagram.Fill(Diagram, model, kind);
        FillLoads(model, kind);
        FillLogs(model, kind);
        for (var post = 0; post < posts.Length; post++)
        {
            posts[post] = Post(model, kind, post);
        }

        LeftGuide = Guide(model, kind, 0);
        RightGuide = Guide(model, kind, model.Bays.Count - 1);
    }

    private void FillLoads(OpeningModel model, CaseKind kind)
    {
        var perSlope = 1 / model.CosRake;
        var bottom = 0.0;
        for (var index = 0; index < logLoads.Length; index++)
        {
            var top = model.EdgeHeight(index + 1);
            var load = Diagram.Within(bottom, top);
            logLoads[index] = new(load.Characteristic * perSlope, load.Design * perSlope);
            bottom = top;
        }

        if (CaseForces.LineLoad(model, kind) is { } line)
        {
            ref var load = ref logLoads[model.LogAt(line.Height)];
            load = new(load.Characteristic + line.Characteristic, load.Design + line.Design);
        }
    }

    private void FillLogs(OpeningModel model, CaseKind kind)
    {
        var judgesDeflection = CaseForces.JudgesDeflection(kind);
        for (var bay = 0; bay < model.Bays.Count; bay++)
        {
            var span = model.Span(bay);
            var responses = logs.AsSpan(bay * logLoads.Length, logLoads.Length);
            for (var index = 0; index < responses.Length; index++)
            {
                responses[index] = LogResponse.Of(
                    logLoads[index], span, model.LogMember(index), CaseForces.OnLog(model, kind, bay, index), judgesDeflection);
            }
        }
    }

    private PostResponse Post(OpeningModel model, CaseKind kind, int post)
    {
        var (force, judged) = (CaseForces.OnPost(model, kind, post), CaseForces.JudgesDeflection(kind));
        return model.Raker is null
            ? Cantilever.Respond(Diagram, model.Post!, model.PostTributary(post), model.FaceLength, model.CosRake, force, judged)
            : PropResponse.Respond(model, Diagram, post, force, judged);
    }

    private GuideResponse Guide(OpeningModel model, CaseKind kind, int bay) => GuideReaction.Of(
        logLoads, model.GuideTributary(bay), model.LogHeights, CaseForces.OnGuide(model, kind, bay));
}

using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Guides;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.Posts;

namespace FloodPanel.Calculation.Cases;

/// <summary>Turns the numbers of a load case into a result with checks and working.</summary>
internal static class CaseReport
{
    public static CaseResult Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers)
    {
        const string title = "Unfactored resultant";
        var line = CaseForces.LineLoad(model, kind);
        return new()
        {
            Kind = kind,
            Factor = CaseDiagram.Factor(model.Factors, kind),
            Resultant = line?.Characteristic ?? numbers.Diagram.Force / model.CosRake,
            CentreOfPressure = line?.Height ?? numbers.Diagram.CentreOfPressure,
            ResultantWorking = line is { } force
                ? DiagramWorking.Resultant(title, force)
                : DiagramWorking.Resultant(title, numbers.Diagram, model.Rake),
            Actions = ActionReport.Of(model, kind),
            Logs = Logs(model, kind, numbers),
            Posts = Posts(model, kind, numbers),
            Guides = Guides(model, kind, numbers),
            Parts = [.. PartRegistry.Of(model, kind, numbers)],
        };
    }

    private static LogResult[] Logs(OpeningModel model, CaseKind kind, CaseEvaluation numbers)
    {
        var count = model.LogCount;
        var results = new LogResult[numbers.Logs.Length];
        for (var index = 0; index < count; index++)
        {
            var working = LineLoad(model, kind, numbers, index);
            for (var bay = 0; bay < model.Bays.Count; bay++)
            {
                // Checks are immutable: a bay as wide as an earlier one shares them.
                var twin = FirstBayAsWide(model.Bays, bay);
                results[bay * count + index] = twin < bay
                    ? results[twin * count + index] with { Bay = bay + 1 }
                    : Log(model, kind, numbers, index, bay, working);
            }
        }

        return results;
    }

    private static Working LineLoad(OpeningModel model, CaseKind kind, CaseEvaluation numbers, int index)
    {
        var line = CaseForces.LineLoad(model, kind);
        return DiagramWorking.LineLoad(
            "Line load on the log",
            numbers.Diagram.Pieces,
            model.EdgeHeight(index),
            model.EdgeHeight(index + 1),
            model.Rake,
            numbers.LogLoads[index],
            line is { } force && model.LogAt(force.Height) == index ? force : null);
    }

    private static LogResult Log(
        OpeningModel model, CaseKind kind, CaseEvaluation numbers, int index, int bay, Working lineLoad)
    {
        var setting = LogFurtherChecks.SettingOf(model, numbers, index, bay);
        var above = index + 1 < model.LogCount ? LogFurtherChecks.SettingOf(model, numbers, index + 1, bay) : null;
        var (log, response) = (setting.Log, setting.Response);
        var judged = CaseForces.JudgesDeflection(kind);
        return new()
        {
            Index = index + 1,
            Bay = bay + 1,
            Bottom = model.EdgeHeight(index),
            Top = model.EdgeHeight(index + 1),
            LineLoad = response.LineLoad,
            PointLoad = response.Point.Design,
            Moment = response.Moment,
            Shear = response.Shear,
            Deflection = response.Deflection,
            LineLoadWorking = lineLoad,
            BendingCheck = LogChecks.Bending(setting),
            ShearCheck = LogChecks.Shear(setting),
            DeflectionCheck = judged ? LogChecks.Deflection(setting) : null,
            MomentWorking = log.Bending is null ? LogChecks.Moment(setting) : null,
            ShearWorking = log.Shear is null ? LogChecks.ShearForce(setting) : null,
            DeflectionWorking = judged ? null : LogChecks.DeflectionOnly(setting),
            Others = LogFurtherChecks.Of(setting, above, judged),
        };
    }

    private static PostResult[] Posts(OpeningModel model, CaseKind kind, CaseEvaluation numbers)
    {
        var results = new PostResult[numbers.Posts.Length];
        var judged = CaseForces.JudgesDeflection(kind);
        for (var post = 0; post < results.Length; post++)
        {
            var response = numbers.Posts[post];
            var setting = new PostChecks.Setting(
                numbers.Diagram, model.Post!, model.PostTributary(post), model.FaceLength, model.Rake,
                CaseForces.OnPost(model, kind, post), model.Basis, model.Raker);
            results[post] = new()
            {
                Index = post + 1,
                BaseShear = response.BaseShear,
                BaseMoment = response.BaseMoment,
                TipDeflection = response.TipDeflection,
                BendingCheck = PostChecks.Bending(response, setting),
                ShearCheck = PostChecks.Shear(response, setting),
                DeflectionCheck = judged ? PostChecks.Deflection(response, setting) : null,
                MomentWorking = model.Post!.Bending is null ? PostChecks.Moment(response, setting) : null,
                ShearWorking = model.Post.Shear is null ? PostChecks.ShearForce(response, setting) : null,
                DeflectionWorking = judged ? null : PostChecks.DeflectionOnly(response, setting),
                Others = [.. PostFurtherChecks.Of(model, post, response, judged)],
            };
        }

        return results;
    }

    private static GuideResult[] Guides(OpeningModel model, CaseKind kind, CaseEvaluation numbers)
    {
        var last = model.Bays.Count - 1;
        return
        [
            Guide("left", numbers.LeftGuide, 0, numbers.LogLoads),
            Guide("right", numbers.RightGuide, last, numbers.LogLoads),
        ];

        GuideResult Guide(string side, GuideResponse response, int bay, ReadOnlySpan<FactoredLoad> loads) => new(
            side,
            response.Reaction,
            response.PeakLineReaction,
            GuideReaction.Explain(
                response, loads, model.Bays[bay], model.EndBearing, model.LogHeights,
                CaseForces.OnGuide(model, kind, bay)));
    }

    private static int FirstBayAsWide(ValueList<double> bays, int bay)
    {
        var first = 0;
        while (bays[first] != bays[bay])
        {
            first++;
        }

        return first;
    }
}

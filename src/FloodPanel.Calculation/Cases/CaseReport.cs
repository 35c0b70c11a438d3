using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Guides;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Posts;

namespace FloodPanel.Calculation.Cases;

/// <summary>Turns the numbers of a load case into a result with checks and working.</summary>
internal static class CaseReport
{
    public static CaseResult Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers) => new()
    {
        Name = CaseNames.InFiles(kind),
        Resultant = numbers.Diagram.Force / model.CosRake,
        CentreOfPressure = numbers.Diagram.CentreOfPressure,
        ResultantWorking = DiagramWorking.Resultant("Unfactored resultant", numbers.Diagram, model.Rake),
        Actions = ActionReport.Of(model, kind),
        Logs = Logs(model, numbers),
        Posts = Posts(model, numbers),
        Guides = Guides(model, numbers),
    };

    private static LogResult[] Logs(OpeningModel model, CaseEvaluation numbers)
    {
        var count = model.LogCount;
        var results = new LogResult[numbers.Logs.Length];
        for (var index = 0; index < count; index++)
        {
            var (bottom, top) = (model.EdgeHeight(index), model.EdgeHeight(index + 1));
            var load = numbers.LogLoads[index];
            var working = DiagramWorking.LineLoad("Line load on the log", numbers.Diagram.Pieces, bottom, top, model.Rake, load);
            for (var bay = 0; bay < model.Bays.Count; bay++)
            {
                // Checks are immutable: a bay as wide as an earlier one shares them.
                var twin = FirstBayAsWide(model.Bays, bay);
                results[bay * count + index] = twin < bay
                    ? results[twin * count + index] with { Bay = bay + 1 }
                    : Log(model, numbers.Logs[bay * count + index], load, index, bay, working);
            }
        }

        return results;
    }

    private static LogResult Log(
        OpeningModel model, in LogResponse response, FactoredLoad load, int index, int bay, Working lineLoad)
    {
        var (clear, bearing) = (model.Bays[bay], model.EndBearing);
        return new()
        {
            Index = index + 1,
            Bay = bay + 1,
            Bottom = model.EdgeHeight(index),
            Top = model.EdgeHeight(index + 1),
            LineLoad = response.LineLoad,
            Moment = response.Moment,
            Shear = response.Shear,
            Deflection = response.Deflection,
            LineLoadWorking = lineLoad,
            BendingCheck = LogChecks.Bending(response, clear, bearing, model.Log),
            ShearCheck = LogChecks.Shear(response, clear, bearing, model.Log),
            DeflectionCheck = LogChecks.Deflection(response, load.Characteristic, clear, bearing, model.Log),
        };
    }

    private static PostResult[] Posts(OpeningModel model, CaseEvaluation numbers)
    {
        var results = new PostResult[numbers.Posts.Length];
        for (var post = 0; post < results.Length; post++)
        {
            var response = numbers.Posts[post];
            var setting = new PostChecks.Setting(
                numbers.Diagram, model.Post!, model.PostTributary(post), model.FaceLength, model.Rake);
            results[post] = new()
            {
                Index = post + 1,
                BaseShear = response.BaseShear,
                BaseMoment = response.BaseMoment,
                TipDeflection = response.TipDeflection,
                BendingCheck = PostChecks.Bending(response, setting),
                ShearCheck = PostChecks.Shear(response, setting),
                DeflectionCheck = PostChecks.Deflection(response, setting),
            };
        }

        return results;
    }

    private static GuideResult[] Guides(OpeningModel model, CaseEvaluation numbers)
    {
        return
        [
            Guide("left", numbers.LeftGuide, model.Bays[0]),
            Guide("right", numbers.RightGuide, model.Bays[^1]),
        ];

        GuideResult Guide(string side, GuideResponse response, double clearBay) => new(
            side,
            response.Reaction,
            response.PeakLineReaction,
            GuideReaction.Explain(response, numbers.LogLoads, clearBay, model.EndBearing, model.Log.Section.Height));
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

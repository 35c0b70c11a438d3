using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Parts;
using FloodPanel.Web.Shared.Forms;

namespace FloodPanel.Web.Shared.Results;

/// <summary>Names a figure of a result, so that it can be found again after the result has changed.</summary>
/// <param name="Name">What it is: the name of a check, or one of the names in <see cref="Figures"/>.</param>
/// <param name="Symbol">Symbol of its line in the working.</param>
/// <param name="Case">Name of the load case; empty outside the cases.</param>
/// <param name="Index">Log, post or action, from 1; 0 where there is but one.</param>
/// <param name="Bay">Bay, from 1; 0 where it does not matter.</param>
/// <param name="Side">Side of a guide, or empty.</param>
/// <param name="Part">Needed check and name of a part, "anchors/post 1", or empty.</param>
public sealed record FigureKey(
    string Name, string Symbol, string Case = "", int Index = 0, int Bay = 0, string Side = "", string Part = "");

/// <summary>The working behind a figure.</summary>
/// <param name="Title">What is worked out.</param>
/// <param name="Where">Member and load case.</param>
/// <param name="Source">Where the method stands.</param>
/// <param name="Steps">The lines.</param>
/// <param name="Check">The check, where the figure belongs to one.</param>
public sealed record FigureWorking(
    string Title, string Where, string Source, IReadOnlyList<CalculationStep> Steps, Check? Check = null);

/// <summary>Finds the working behind a figure.</summary>
public static class Figures
{
    public const string LineLoad = "line-load";
    public const string LogBending = "log-bending";
    public const string LogShear = "log-shear";
    public const string LogDeflection = "log-deflection";
    public const string PostBending = "post-bending";
    public const string PostShear = "post-shear";
    public const string PostDeflection = "post-deflection";
    public const string Guide = "guide";
    public const string Resultant = "resultant";
    public const string Action = "action";
    public const string ActionResultant = "action-resultant";
    public const string Levels = "levels";
    public const string Freeboard = "freeboard";
    public const string Schedule = "schedule";
    public const string Leakage = "leakage";
    public const string HoldDown = "hold-down";

    /// <summary>The working behind a figure; null when the result no longer holds it.</summary>
    public static FigureWorking? Find(OpeningResult result, FigureKey key) => key.Name switch
    {
        Levels => Of(result.Levels, ""),
        Freeboard => Of(result.Freeboard, ""),
        HoldDown => result.HoldDowns.FirstOrDefault(row => row.Bay == key.Bay) is { } held ? Of(held.Working, BayName(held.Bay)) : null,
        Leakage => result.Leakage is { } leakage ? Of(leakage.Working, "") : null,
        Schedule => result.Schedule.FirstOrDefault(row => row.Bay == key.Bay && (key.Index == 0 || row.FirstLog == key.Index)) is { } row ? Of(row.Working, BayName(row.Bay)) : null,
        _ => result.Cases.FirstOrDefault(c => c.Name == key.Case) is { } loadCase ? InCase(loadCase, key) : null,
    };

    /// <summary>The figure that governs; null when none does.</summary>
    public static FigureKey? Governing(OpeningResult result)
    {
        if (result.Verdict.Governing is not { } governing)
        {
            return null;
        }

        return governing.Case is null
            ? new(governing.Check, "u")
            : Candidates(result, governing).FirstOrDefault(key => Find(result, key)?.Check?.Utilisation == governing.Utilisation);
    }

    private static IEnumerable<FigureKey> Candidates(OpeningResult result, Governing governing)
    {
        var loadCase = result.Cases.First(c => c.Name == governing.Case);
        return loadCase.Posts.Select(p => new FigureKey(governing.Check, "u", loadCase.Name, p.Index))
            .Concat(loadCase.Logs.Select(l => new FigureKey(governing.Check, "u", loadCase.Name, l.Index, l.Bay)))
            .Concat(loadCase.Parts.Select(p => OfPart(loadCase.Name, p, governing.Check)));
    }

    /// <summary>The figure that a check or a working of a part is.</summary>
    /// <param name="loadCase">Name of the load case.</param>
    /// <param name="part">The part.</param>
    /// <param name="name">Name of the check, or title of the working.</param>
    /// <param name="symbol">Symbol of the line.</param>
    public static FigureKey OfPart(string loadCase, PartResult part, string name, string symbol = "u") =>
        new(name, symbol, loadCase, Part: $"{part.Check}/{part.Member}");

    private static FigureWorking? InPart(CaseResult loadCase, FigureKey key, string inCase)
    {
        foreach (var part in loadCase.Parts.Where(p => key.Part == $"{p.Check}/{p.Member}"))
        {
            var where = Sentence($"{part.Member}, {inCase}");
            if (part.Checks.FirstOrDefault(c => c.Name == key.Name) is { } check)
            {
                return Of(check, where);
            }

            if (part.Workings.FirstOrDefault(w => w.Title == key.Name) is { } working)
            {
                return Of(working, where);
            }
        }

        return null;
    }

    private static FigureWorking? InCase(CaseResult loadCase, FigureKey key)
    {
        var inCase = $"{CaseNames.InWords(loadCase.Name)} case";
        if (key.Part.Length > 0)
        {
            return InPart(loadCase, key, inCase);
        }

        switch (key.Name)
        {
            case Resultant:
                return Of(loadCase.ResultantWorking, Sentence(inCase));
            case Action:
                var action = loadCase.Actions.ElementAtOrDefault(key.Index - 1);
                return action is null ? null : Of(action.Working, Sentence(inCase));
            case ActionResultant:
                return loadCase.Actions.ElementAtOrDefault(key.Index - 1) is { } acting ? Of(acting.ResultantWorking, Sentence(inCase)) : null;
            case Guide:
                var guide = loadCase.Guides.FirstOrDefault(g => g.Side == key.Side);
                return guide is null ? null : Of(guide.Working, $"{Words.FromName(guide.Side)} guide, {inCase}");
        }

        var log = loadCase.Logs.FirstOrDefault(l => l.Index == key.Index && l.Bay == key.Bay);
        var post = loadCase.Posts.FirstOrDefault(p => p.Index == key.Index);
        return key.Name switch
        {
            LineLoad when log is not null => Of(log.LineLoadWorking, $"{LogName(log)}, {inCase}"),
            LogBending when log?.BendingCheck is { } check => Of(check, $"{LogName(log)}, {inCase}"),
            LogShear when log?.ShearCheck is { } check => Of(check, $"{LogName(log)}, {inCase}"),
            LogBending when log?.MomentWorking is { } working => Of(working, $"{LogName(log)}, {inCase}"),
            LogShear when log?.ShearWorking is { } working => Of(working, $"{LogName(log)}, {inCase}"),
            LogDeflection when log?.DeflectionCheck is { } check => Of(check, $"{LogName(log)}, {inCase}"),
            LogDeflection when log?.DeflectionWorking is { } working => Of(working, $"{LogName(log)}, {inCase}"),
            PostBending when post?.BendingCheck is { } check => Of(check, $"{PostName(post)}, {inCase}"),
            PostShear when post?.ShearCheck is { } check => Of(check, $"{PostName(post)}, {inCase}"),
            PostBending when post?.MomentWorking is { } working => Of(working, $"{PostName(post)}, {inCase}"),
            PostShear when post?.ShearWorking is { } working => Of(working, $"{PostName(post)}, {inCase}"),
            PostDeflection when post?.DeflectionCheck is { } check => Of(check, $"{PostName(post)}, {inCase}"),
            PostDeflection when post?.DeflectionWorking is { } working => Of(working, $"{PostName(post)}, {inCase}"),
            _ when key.Bay > 0 && log?.Others.FirstOrDefault(c => c.Name == key.Name) is { } check => Of(check, $"{LogName(log)}, {inCase}"),
            _ when key.Bay == 0 && post?.Others.FirstOrDefault(c => c.Name == key.Name) is { } check => Of(check, $"{PostName(post)}, {inCase}"),
            _ => null,
        };
    }

    private static FigureWorking Of(Working working, string where) => new(working.Title, where, working.Source, working.Steps);

    private static FigureWorking Of(Check check, string where) => new(check.Title, where, check.Source, check.Steps, check);

    private static string LogName(LogResult log) => $"Log {Number(log.Index)}, {BayName(log.Bay).ToLowerInvariant()}";

    private static string PostName(PostResult post) => $"Post {Number(post.Index)}";

    private static string Sentence(string words) => char.ToUpperInvariant(words[0]) + words[1..];

    private static string BayName(int bay) => $"Bay {Number(bay)}";

    private static string Number(int value) => value.ToString(CultureInfo.InvariantCulture);
}

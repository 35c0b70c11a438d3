using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench.Loads;

/// <summary>Waves, breaking or not.</summary>
public sealed partial class WaveFields
{
    private static readonly bool[] Kinds = [true, false];

    private WaveInput other = new NonBreakingWaveInput { Height = 0.3, Period = 3 };

    protected override string What => "waves";

    protected override WaveInput First => new BreakingWaveInput();

    protected override WaveInput? Of(ActionSet actions) => actions.Wave;

    protected override ActionSet With(ActionSet actions, WaveInput? action) => actions with { Wave = action };

    private static string KindWords(bool breaking) => breaking ? "Breaking" : "Non-breaking";

    // The kind that is left is kept for the way back.
    private Task ChooseKind(bool breaking)
    {
        if (Opening.Actions.Wave is not { } now || now is BreakingWaveInput == breaking)
        {
            return Task.CompletedTask;
        }

        var next = other is BreakingWaveInput == breaking ? other : First;
        other = now;
        return Set("kind of waves", next);
    }
}

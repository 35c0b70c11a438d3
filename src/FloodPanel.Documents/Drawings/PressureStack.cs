using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;

namespace FloodPanel.Documents.Drawings;

/// <summary>One corner of an action's band in the stack.</summary>
/// <param name="Z">Height above the sill [m].</param>
/// <param name="Below">Unfactored pressure of the actions stacked before it [Pa].</param>
/// <param name="Sum">The same with this action added [Pa].</param>
public readonly record struct StackPoint(double Z, double Below, double Sum);

/// <summary>One action in the stack.</summary>
/// <param name="Kind">The action.</param>
/// <param name="Points">Its corners from the sill upward, two at a height where the pressure jumps.</param>
public sealed record StackBand(ActionKind Kind, IReadOnlyList<StackPoint> Points);

/// <summary>The pressures of a case, one action upon another.</summary>
public static class PressureStack
{
    /// <summary>Bands of the actions that press, in their order, unfactored.</summary>
    /// <param name="actions">The actions of a case.</param>
    public static IReadOnlyList<StackBand> Of(IReadOnlyList<ActionResult> actions)
    {
        var heights = actions.SelectMany(a => a.Pieces).SelectMany(p => new[] { p.Bottom, p.Top })
            .Distinct().Order().ToArray();
        var bands = actions.Select(a => new List<StackPoint>()).ToArray();
        for (var i = 0; i + 1 < heights.Length; i++)
        {
            var (low, high) = (heights[i], heights[i + 1]);
            var (lowSum, highSum) = (0.0, 0.0);
            for (var a = 0; a < actions.Count; a++)
            {
                var (lowPressure, highPressure) = Between(actions[a].Pieces, low, high);
                bands[a].Add(new StackPoint(low, lowSum, lowSum + lowPressure));
                bands[a].Add(new StackPoint(high, highSum, highSum + highPressure));
                (lowSum, highSum) = (lowSum + lowPressure, highSum + highPressure);
            }
        }

        return
        [
            .. actions.Zip(bands, (action, points) => new StackBand(action.Kind, points))
                .Where(b => b.Points.Any(p => p.Sum != p.Below)),
        ];
    }

    /// <summary>Pressure just above one height and just below the next, between which no piece begins or ends.</summary>
    private static (double Low, double High) Between(IReadOnlyList<PressurePiece> pieces, double low, double high)
    {
        var middle = (low + high) / 2;
        var (atLow, atHigh) = (0.0, 0.0);
        foreach (var piece in pieces)
        {
            if (piece.Bottom < middle && piece.Top > middle)
            {
                atLow += piece.At(low);
                atHigh += piece.At(high);
            }
        }

        return (atLow, atHigh);
    }
}

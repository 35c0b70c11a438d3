namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>What the reader of a debris load must know.</summary>
public static class DebrisNotes
{
    /// <summary>Notes on the debris of an opening; none where the sill stays dry, which has a note of its own.</summary>
    /// <param name="debris">The debris, resolved.</param>
    public static IEnumerable<Note> Of(DebrisModel debris)
    {
        if (debris.IsDry)
        {
            yield break;
        }

        var factors = debris.Input.Coefficients;
        (string Name, double Value)[] entered =
        [
            ("velocity", debris.Input.Velocity),
            ("importance", factors.Importance),
            ("orientation", factors.Orientation),
            ("depth coefficient", factors.Depth),
            ("screening", factors.Blockage),
            ("response", factors.Response ?? 1),
        ];
        var zero = string.Join(" and ", entered.Where(e => e.Value == 0).Select(e => e.Name));
        if (zero.Length > 0)
        {
            yield return new("debris-without-effect", new(
                $"With {zero} at 0, debris puts no force on the barrier: the debris case holds water only. Check that this is meant."));
        }
    }
}

namespace FloodPanel.Calculation.ProjectTree;

/// <summary>H of an opening that is still being validated.</summary>
internal static class BarrierHeight
{
    /// <summary>Vertical height of the stack of logs [m]; null where a height or a count is refused itself, and so says nothing.</summary>
    public static double? Of(Opening opening, Library library)
    {
        var length = 0.0;
        foreach (var group in opening.Barrier.Logs.Groups)
        {
            if (library.Find(group.Profile) is not { } profile
                || !Fields.ProfileHeight.Allows(profile.Height) || !Fields.LogCount.Allows(group.Count))
            {
                return null;
            }

            length += group.Count * profile.Height;
        }

        return length * Math.Cos(double.DegreesToRadians(opening.RakeDegrees));
    }
}

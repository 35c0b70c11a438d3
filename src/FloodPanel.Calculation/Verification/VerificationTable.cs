namespace FloodPanel.Calculation.Verification;

/// <summary>Everything published that the calculation is held against. The tests demand that every row agrees.</summary>
public static class VerificationTable
{
    /// <summary>The rows, computed anew, in the order of the chain from water to members.</summary>
    public static IReadOnlyList<VerificationRow> Rows() =>
    [
        .. LevelRows.Rows(),
        .. WaterRows.Rows(),
        .. PlaneAreaRows.Rows(),
        .. FlowRows.Rows(),
        .. WaveRows.Rows(),
        .. DebrisRows.Rows(),
        .. MemberRows.Rows(),
        .. PostBaseRows.Rows(),
        .. LogRows.Rows(),
        .. GuideRows.Rows(),
        .. AnchorRows.Rows(),
        .. FootingRows.Rows(),
        .. LeakageRows.Rows(),
        .. CoverRows.Rows(),
    ];
}

namespace FloodPanel.Calculation;

/// <summary>Physical constants.</summary>
public static class Physics
{
    /// <summary>g, standard gravity [m/s²]: 9.80665 exactly (3rd General Conference on Weights and Measures, 1901).</summary>
    public const double Gravity = 9.80665;
}

namespace FloodPanel.Calculation.Actions;

/// <summary>Moving water against the face of the barrier.</summary>
public static class Flow
{
    /// <summary>Greatest velocity of the surcharge method [m/s], 10 ft/s.</summary>
    public const double SurchargeVelocityLimit = 3.05;

    /// <summary>Source of the surcharge method, as printed.</summary>
    public const string SurchargeSource = "ASCE 7, 5.4.3 (equivalent surcharge depth)";

    /// <summary>Source of the drag method, as printed.</summary>
    public const string DragSource = "FEMA P-55 (2011), Eq. 8.8 and Table 8-2 (coefficients from memory)";

    /// <summary>d_h = a·V²/(2g), equivalent surcharge depth [m].</summary>
    /// <param name="velocity">V, flow velocity [m/s], ≥ 0.</param>
    /// <param name="shapeCoefficient">a, shape coefficient [-], ≥ 1.25.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: ASCE 7, 5.4.3. Limits: V ≤ 3.05 m/s; above, <see cref="Pressure"/> changes the method.</remarks>
    public static double SurchargeDepth(double velocity, double shapeCoefficient)
    {
        Guard.NonNegative(velocity);
        Guard.InRange(shapeCoefficient, 1.25, double.MaxValue);

        return shapeCoefficient * velocity * velocity / (2 * Physics.Gravity);
    }

    /// <summary>C_d, drag coefficient by clear width over wetted height [-].</summary>
    /// <param name="ratio">Clear width / wetted height [-], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is not above zero.</exception>
    /// <remarks>
    /// Source: FEMA P-55 (2011), Table 8-2 (values from memory; the entry for 41 to 80 is remembered as 1.6 or 1.75
    /// and the larger is used). Limits of the rows are read as ≤ 12, ≤ 20, ≤ 32, ≤ 40, ≤ 80, ≤ 120, above.
    /// </remarks>
    public static double DragCoefficient(double ratio)
    {
        Guard.Positive(ratio);

        return ratio switch
        {
            <= 12 => 1.25,
            <= 20 => 1.3,
            <= 32 => 1.4,
            <= 40 => 1.5,
            <= 80 => 1.75,
            <= 120 => 1.8,
            _ => 2.0,
        };
    }

    /// <summary>Uniform pressure of moving water on the wetted height [Pa].</summary>
    /// <param name="velocity">V, flow velocity [m/s], ≥ 0.</param>
    /// <param name="shapeCoefficient">a, shape coefficient of the surcharge method [-], ≥ 1.25.</param>
    /// <param name="unitWeight">γ, unit weight of water [N/m³], > 0.</param>
    /// <param name="clearWidth">Clear width of the opening [m], > 0.</param>
    /// <param name="wettedHeight">Wetted height of the barrier [m], > 0.</param>
    /// <returns>
    /// γ·a·V²/(2g) up to 3.05 m/s; above, C_d·ρ·V²/2 but never less than the surcharge method's value.
    /// </returns>
    /// <remarks>Source: ASCE 7, 5.4.3; FEMA P-55 (2011), Eq. 8.8. Limits: a detailed analysis is asked for above 3.05 m/s.</remarks>
    public static double Pressure(
        double velocity, double shapeCoefficient, double unitWeight, double clearWidth, double wettedHeight)
    {
        var surcharge = unitWeight * SurchargeDepth(velocity, shapeCoefficient);
        if (velocity <= SurchargeVelocityLimit)
        {
            return surcharge;
        }

        var drag = DragCoefficient(clearWidth / wettedHeight) * unitWeight * velocity * velocity / (2 * Physics.Gravity);
        return Math.Max(drag, surcharge);
    }
}

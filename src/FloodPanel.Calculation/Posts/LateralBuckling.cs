namespace FloodPanel.Calculation.Posts;

/// <summary>Lateral-torsional buckling of I-sections that bend about their strong axis, loaded through their middle and free at the tip.</summary>
public static class LateralBuckling
{
    /// <summary>Elastic critical moment, M_cr = (π/L)·√(E·I_z·(G·J + π²·E·I_z·h_o²/(4·L²))).</summary>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="shearModulus">G [Pa], > 0.</param>
    /// <param name="inertia">I_z, across the direction of the load [m⁴], > 0.</param>
    /// <param name="torsion">J [m⁴], > 0.</param>
    /// <param name="flanges">h_o, between the middles of the flanges [m], > 0.</param>
    /// <param name="length">L, unbraced length [m], > 0.</param>
    /// <returns>M_cr [N·m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    /// <remarks>
    /// Source: elastic stability, uniform moment. For a cantilever under a load through the middle of its section it is safe: a force at the tip of a
    /// narrow bar needs 4.013 in the place of π (from memory), water, whose force is low, more.
    /// </remarks>
    public static double ElasticMoment(
        double modulus, double shearModulus, double inertia, double torsion, double flanges, double length)
    {
        Guard.Positive(modulus);
        Guard.Positive(shearModulus);
        Guard.Positive(inertia);
        Guard.Positive(torsion);
        Guard.Positive(flanges);
        Guard.Positive(length);

        var bending = modulus * inertia;
        var warping = Math.PI * Math.PI * bending * flanges * flanges / (4 * length * length);
        return Math.PI / length * Math.Sqrt(bending * (shearModulus * torsion + warping));
    }

    /// <summary>Nominal moment of a compact I-section, M_n, with the limits L_p and L_r of its unbraced length.</summary>
    /// <param name="yield">F_y [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="elastic">S_x, elastic modulus [m³], > 0.</param>
    /// <param name="plastic">Z_x, plastic modulus [m³], > 0.</param>
    /// <param name="radius">r_y [m], > 0.</param>
    /// <param name="effectiveRadius">r_ts [m], > 0.</param>
    /// <param name="torsion">J [m⁴], > 0.</param>
    /// <param name="flanges">h_o [m], > 0.</param>
    /// <param name="length">L_b [m], > 0.</param>
    /// <param name="gradient">C_b [-], 1 for a cantilever.</param>
    /// <returns>M_n [N·m], L_p and L_r [m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    /// <remarks>Source: AISC 360-22, F2 (from memory).</remarks>
    public static (double Moment, double PlasticLength, double ElasticLength) SteelUs(
        double yield, double modulus, double elastic, double plastic, double radius, double effectiveRadius, double torsion,
        double flanges, double length, double gradient = 1)
    {
        Guard.Positive(yield);
        Guard.Positive(length);

        var plasticMoment = yield * plastic;
        var plasticLength = 1.76 * radius * Math.Sqrt(modulus / yield);
        var part = torsion / (elastic * flanges);
        var strain = 0.7 * yield / modulus;
        var elasticLength = 1.95 * effectiveRadius / strain * Math.Sqrt(part + Math.Sqrt(part * part + 6.76 * strain * strain));
        if (length <= plasticLength)
        {
            return (plasticMoment, plasticLength, elasticLength);
        }

        var slenderness = length / effectiveRadius;
        var moment = length <= elasticLength
            ? plasticMoment - (plasticMoment - 0.7 * yield * elastic) * (length - plasticLength) / (elasticLength - plasticLength)
            : elastic * Math.PI * Math.PI * modulus / (slenderness * slenderness) * Math.Sqrt(1 + 0.078 * part * slenderness * slenderness);
        return (Math.Min(plasticMoment, gradient * moment), plasticLength, elasticLength);
    }

    /// <summary>Nominal moment of an aluminium member, M_nmb.</summary>
    /// <param name="yield">F_cy [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="elastic">S_c [m³], > 0.</param>
    /// <param name="plasticMoment">M_np [N·m], > 0.</param>
    /// <param name="slenderness">λ = π·√(E·S_c/M_cr) [-], > 0.</param>
    /// <returns>M_np·(1 − λ/C_c) + π²·E·λ·S_c/C_c³ below C_c, else π²·E·S_c/λ² [N·m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    /// <remarks>Source: Aluminum Design Manual 2020, F.4; read for tubes in Part VII, Example 4. Limits: tempers T5 to T9.</remarks>
    public static double AluminiumUs(double yield, double modulus, double elastic, double plasticMoment, double slenderness)
    {
        Guard.Positive(elastic);
        Guard.Positive(plasticMoment);
        Guard.Positive(slenderness);

        var limit = Columns.BucklingConstants(yield, modulus).Limit;
        var euler = Math.PI * Math.PI * modulus * elastic;
        return slenderness < limit
            ? plasticMoment * (1 - slenderness / limit) + euler * slenderness / (limit * limit * limit)
            : euler / (slenderness * slenderness);
    }
}

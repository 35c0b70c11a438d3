namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Every numeric input of the project with its limits. The limits are wide: they catch slips, not designs.</summary>
public static class Fields
{
    private const double Level = 9000;

    /// <summary>Site.WaterDensity.</summary>
    public static Field WaterDensity { get; } = new("waterDensity", "Water density", Dimension.Density, 990, 1400,
        "1000 kg/m³ fresh, 1025 kg/m³ sea, more with sediment.");

    /// <summary>Site.AnnualProbability.</summary>
    public static Field AnnualProbability { get; } = new("annualProbability", "Annual exceedance probability",
        Dimension.Probability, 1e-6, 0.999, "Chance that the still-water level is exceeded in a year; 0.01, 1 % or 1 in 100 is once in 100 years on average.");

    /// <summary>Site.DesignStillWaterLevel.</summary>
    public static Field DesignStillWaterLevel { get; } = new("designStillWaterLevel", "Design still-water level",
        Dimension.Length, -Level, Level, "Level without waves at the chosen probability, before the allowances.");

    /// <summary>Site.Surge.</summary>
    public static Field Surge { get; } = new("surge", "Surge", Dimension.Length, 0, 20, "Added to the still-water level.");

    /// <summary>Site.ClimateAllowance.</summary>
    public static Field ClimateAllowance { get; } = new("climateAllowance", "Climate allowance", Dimension.Length, 0, 10,
        "Added to the still-water level for the years to come.");

    /// <summary>Site.ClimateRatePerYear.</summary>
    public static Field ClimateRate { get; } = new("climateRatePerYear", "Climate rate", Dimension.LengthPerYear, 0, 0.1,
        "Rise of the level in a year; over the design life it adds to the allowance.");

    /// <summary>Site.DesignLifeYears.</summary>
    public static Field DesignLife { get; } = new("designLifeYears", "Design life", Dimension.Years, 1, 200, "Years that the barrier should serve.");

    /// <summary>Site.Freeboard.</summary>
    public static Field Freeboard { get; } = new("freeboard", "Freeboard", Dimension.Length, 0, 5,
        "Height of barrier wanted above the design flood level.");

    /// <summary>LevelPoint.AnnualProbability.</summary>
    public static Field LevelProbability { get; } = AnnualProbability;

    /// <summary>LevelPoint.Level.</summary>
    public static Field LevelValue { get; } = new("level", "Level", Dimension.Length, -Level, Level, "Still-water level at that probability.");

    /// <summary>Opening.SillLevel.</summary>
    public static Field SillLevel { get; } = new("sillLevel", "Sill level", Dimension.Length, -Level, Level,
        "Lowest surveyed point of the sill.");

    /// <summary>Opening.GroundLevel.</summary>
    public static Field GroundLevel { get; } = new("groundLevel", "Outside ground level", Dimension.Length, -Level, Level,
        "Lowest outside ground near the opening; empty means the sill level.");

    /// <summary>Opening.ClearWidth.</summary>
    public static Field ClearWidth { get; } = new("clearWidth", "Clear width", Dimension.Length, 0.1, 100,
        "Clear width of the opening between its reveals.");

    /// <summary>Opening.ClearHeight.</summary>
    public static Field ClearHeight { get; } = new("clearHeight", "Clear height", Dimension.Length, 0.1, 30,
        "Clear height of the opening above the sill.");

    /// <summary>Opening.RakeDegrees.</summary>
    public static Field Rake { get; } = new("rake", "Rake", Dimension.Degrees, 0, 60,
        "Angle of the barrier from the vertical, top leaning to the protected side.");

    /// <summary>Opening.ProtectedSideLevel.</summary>
    public static Field ProtectedSideLevel { get; } = new("protectedSideLevel", "Protected-side water level", Dimension.Length,
        -Level, Level, "Water level that certainly stands on the dry side; empty means dry.");

    /// <summary>FlowInput.Velocity.</summary>
    public static Field FlowVelocity { get; } = new("velocity", "Flow velocity", Dimension.Velocity, 0, 15, "Velocity of the water in front of the barrier.");

    /// <summary>FlowInput.ShapeCoefficient.</summary>
    public static Field ShapeCoefficient { get; } = new("shapeCoefficient", "Shape coefficient", Dimension.Ratio, 1.25, 3,
        "a in the surcharge depth a·V²/2g; at least 1.25.");

    /// <summary>BreakingWaveInput.RiskCategory.</summary>
    public static Field RiskCategory { get; } = new("riskCategory", "Risk category", Dimension.Count, 1, 4, "Of the building, 1 to 4.");

    /// <summary>NonBreakingWaveInput.Height.</summary>
    public static Field WaveHeight { get; } = new("height", "Wave height", Dimension.Length, 0, 20, "Design wave height.", true);

    /// <summary>NonBreakingWaveInput.Period.</summary>
    public static Field WavePeriod { get; } = new("period", "Wave period", Dimension.Time, 0.5, 60, "Wave period.");

    /// <summary>NonBreakingWaveInput.AngleDegrees.</summary>
    public static Field WaveAngle { get; } = new("angle", "Wave angle", Dimension.Degrees, 0, 90, "Between wave direction and the normal to the wall.");

    /// <summary>NonBreakingWaveInput.BedSlope.</summary>
    public static Field BedSlope { get; } = new("bedSlope", "Bed slope", Dimension.Ratio, 0, 1, "Rise over run in front of the wall.");

    /// <summary>DebrisInput.Mass.</summary>
    public static Field DebrisMass { get; } = new("mass", "Debris mass", Dimension.Mass, 0, 100_000, "Mass of the object.", true);

    /// <summary>DebrisInput.Velocity.</summary>
    public static Field DebrisVelocity { get; } = new("velocity", "Debris velocity", Dimension.Velocity, 0, 15, "Velocity of the object.");

    /// <summary>DebrisInput.StoppingTime.</summary>
    public static Field StoppingTime { get; } = new("stoppingTime", "Stopping time", Dimension.Time, 0, 5, "Time in which the object is stopped.", true);

    /// <summary>DebrisCoefficients, each of them.</summary>
    public static Field DebrisCoefficient { get; } = new("coefficients", "Debris coefficient", Dimension.Ratio, 0, 5, "Factor on the impact force.");

    /// <summary>WindInput.Pressure.</summary>
    public static Field WindPressure { get; } = new("pressure", "Wind pressure", Dimension.Pressure, 0, 20_000, "On the dry barrier.");

    /// <summary>LineInput.Force.</summary>
    public static Field LineLoadForce { get; } = new("force", "Line load", Dimension.LineForce, 0, 100_000, "Per metre of width, on the dry barrier.");

    /// <summary>LineInput.Height.</summary>
    public static Field LineLoadHeight { get; } = new("height", "Line load height", Dimension.Length, 0, 30, "Above the sill.");

    /// <summary>LoadFactors, each of them.</summary>
    public static Field LoadFactor { get; } = new("factor", "Load factor", Dimension.Ratio, 0.1, 5, "On the load, for strength checks; deflections are not factored.");

    /// <summary>StrengthRule.Multiplier and StrengthRule.Divisor.</summary>
    public static Field StrengthFactor { get; } = new("factor", "Strength factor", Dimension.Ratio, 0.1, 10, "Multiplies or divides the characteristic strength.");

    /// <summary>LeakageInput.Rate.</summary>
    public static Field LeakRate { get; } = new("rate", "Leak rate", Dimension.LeakRate, 0, 0.01, "Allowed by a test, or measured.");

    /// <summary>LeakageInput.RainIntensity.</summary>
    public static Field RainIntensity { get; } = new("rainIntensity", "Rain intensity", Dimension.RainIntensity, 0, 1e-3 / 3600 * 1000, "Of the heaviest rain that falls while the barrier stands.");

    /// <summary>LeakageInput.RainArea.</summary>
    public static Field RainArea { get; } = new("rainArea", "Area behind", Dimension.Area, 0, 1e6, "That drains towards the barrier on the protected side.");

    /// <summary>LeakageInput.RunoffCoefficient.</summary>
    public static Field RunoffCoefficient { get; } = new("runoffCoefficient", "Runoff coefficient", Dimension.Ratio, 0, 1, "0.9 paved, 0.3 lawn (common practice).");

    /// <summary>LeakageInput.SumpVolume.</summary>
    public static Field SumpVolume { get; } = new("sumpVolume", "Sump volume", Dimension.Volume, 0, 1000, "Where the pump stands; nothing for none.");

    /// <summary>LeakageInput.PumpMargin.</summary>
    public static Field PumpMargin { get; } = new("pumpMargin", "Pump margin", Dimension.Ratio, 1, 10, "Pump flow over inflow.");

    /// <summary>LogStack.Count.</summary>
    public static Field LogCount { get; } = new("count", "Number of logs", Dimension.Count, 1, 100, "Logs in the stack.");

    /// <summary>LogStack.EndBearing.</summary>
    public static Field EndBearing { get; } = new("endBearing", "End bearing", Dimension.SectionLength, 0, 0.5,
        "Length of log that bears at each end.", true);

    /// <summary>LogStack.DeflectionLimit.</summary>
    public static Field LogDeflectionLimit { get; } = new("deflectionLimit", "Log deflection limit", Dimension.Count, 10, 5000,
        "n in the limit span / n.");

    /// <summary>LogStack.FittingClearance.</summary>
    public static Field FittingClearance { get; } = new("fittingClearance", "Fitting clearance", Dimension.SectionLength, 0, 0.1,
        "Total end play taken off the cutting length of a log.");

    /// <summary>LogStack.SealPreload.</summary>
    public static Field SealPreload { get; } = new("sealPreload", "Bottom seal push", Dimension.LineForce, 0, 20_000, "Upward, when the seal under the lowest log is pressed together.");

    /// <summary>Each of Barrier.Bays.</summary>
    public static Field BayWidth { get; } = new("bays", "Clear bay", Dimension.Length, 0.05, 100, "Clear width of a bay.");

    /// <summary>PostSet.Width.</summary>
    public static Field PostWidth { get; } = new("width", "Post width", Dimension.SectionLength, 0, 2,
        "Width that a post takes out of the opening.", true);

    /// <summary>PostSet.DeflectionLimit.</summary>
    public static Field PostDeflectionLimit { get; } = new("deflectionLimit", "Post deflection limit", Dimension.Count, 10, 5000,
        "n in the limit post length / n.");

    /// <summary>Material.Density.</summary>
    public static Field MaterialDensity { get; } = new("density", "Density", Dimension.Density, 0, 25_000, "Of the material.", true);

    /// <summary>Material.ElasticModulus.</summary>
    public static Field ElasticModulus { get; } = new("elasticModulus", "Elastic modulus", Dimension.ElasticModulus, 1e8, 1e12, "Along the member.");

    /// <summary>Material.BendingStrength.</summary>
    public static Field BendingStrength { get; } = new("bendingStrength", "Bending strength", Dimension.Stress, 0, 5e9,
        "Characteristic yield strength of a metal, or bending strength of timber.", true);

    /// <summary>Material.ShearStrength.</summary>
    public static Field ShearStrength { get; } = new("shearStrength", "Shear strength", Dimension.Stress, 0, 5e9, "Characteristic shear strength.", true);

    /// <summary>Material.AllowableBending.</summary>
    public static Field AllowableBending { get; } = new("allowableBending", "Allowable bending stress", Dimension.Stress, 0, 5e9,
        "Wins over a value derived from the strength; under a strength basis, the design resistance.", true);

    /// <summary>Material.AllowableShear.</summary>
    public static Field AllowableShear { get; } = new("allowableShear", "Allowable shear stress", Dimension.Stress, 0, 5e9,
        "Wins over a value derived from the strength; under a strength basis, the design resistance.", true);

    /// <summary>Profile.Height.</summary>
    public static Field ProfileHeight { get; } = new("height", "Profile height", Dimension.SectionLength, 0, 2,
        "Log: size along the stack; post: size across the opening.", true);

    /// <summary>Profile.Depth.</summary>
    public static Field ProfileDepth { get; } = new("depth", "Profile depth", Dimension.SectionLength, 0, 2, "Size in the direction of the water.", true);

    /// <summary>HollowRectangle.Face.</summary>
    public static Field Face { get; } = new("face", "Face thickness", Dimension.SectionLength, 0, 0.5, "Each of the two faces, wet and dry.", true);

    /// <summary>HollowRectangle.Web and ISection.Web.</summary>
    public static Field Web { get; } = new("web", "Web thickness", Dimension.SectionLength, 0, 0.5, "Each web.", true);

    /// <summary>HollowRectangle.Webs.</summary>
    public static Field Webs { get; } = new("webs", "Number of webs", Dimension.Count, 2, 50, "The two outer webs included.");

    /// <summary>RectangularTube.Wall.</summary>
    public static Field Wall { get; } = new("wall", "Wall thickness", Dimension.SectionLength, 0, 0.5, "Of the tube.", true);

    /// <summary>RectangularTube.CornerRadius.</summary>
    public static Field CornerRadius { get; } = new("cornerRadius", "Outer corner radius", Dimension.SectionLength, 0, 1,
        "EN 10210-2: 1.5 × wall; EN 10219-2: 2 × wall up to 6 mm, 2.5 × to 10 mm, 3 × above.");

    /// <summary>RectangularTube.InnerRadius.</summary>
    public static Field InnerRadius { get; } = new("innerRadius", "Inner corner radius", Dimension.SectionLength, 0, 1,
        "EN 10210-2: the wall; EN 10219-2: the outer radius less the wall.");

    /// <summary>ISection.Flange.</summary>
    public static Field Flange { get; } = new("flange", "Flange thickness", Dimension.SectionLength, 0, 0.5, "Each flange.", true);

    /// <summary>GivenProperties.Area.</summary>
    public static Field Area { get; } = new("area", "Area", Dimension.SectionArea, 0, 4, "Of the section.", true);

    /// <summary>GivenProperties.Inertia.</summary>
    public static Field Inertia { get; } = new("inertia", "Second moment of area", Dimension.SecondMoment, 0, 2, "For bending in the direction of the water.", true);

    /// <summary>GivenProperties.Modulus.</summary>
    public static Field Modulus { get; } = new("modulus", "Elastic section modulus", Dimension.SectionModulus, 0, 2, "For bending in the direction of the water.", true);

    /// <summary>GivenProperties.PlasticModulus.</summary>
    public static Field PlasticModulus { get; } = new("plasticModulus", "Plastic section modulus", Dimension.SectionModulus, 0, 2, "For bending in the direction of the water.", true);

    /// <summary>GivenProperties.ShearArea.</summary>
    public static Field ShearArea { get; } = new("shearArea", "Shear area", Dimension.SectionArea, 0, 4, "Shear force over shear area is the shear stress.", true);
}

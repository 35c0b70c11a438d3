using System.Globalization;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>A project typed again from what its forms show in one system of units: nine figures of each number.</summary>
internal sealed class Retyped(UnitSystem system)
{
    public Scenario Of(Scenario scenario) => new(scenario.Project with
    {
        Site = Of(scenario.Site),
        Openings = [Of(scenario.Opening)],
    });

    private Site Of(Site site) => site with
    {
        WaterDensity = Read(site.WaterDensity, Fields.WaterDensity),
        DesignStillWaterLevel = Read(site.DesignStillWaterLevel, Fields.DesignStillWaterLevel),
        Surge = Read(site.Surge, Fields.Surge),
        ClimateAllowance = Read(site.ClimateAllowance, Fields.ClimateAllowance),
        ClimateRatePerYear = Read(site.ClimateRatePerYear, Fields.ClimateRate),
        DesignLifeYears = Read(site.DesignLifeYears, Fields.DesignLife),
        Freeboard = Read(site.Freeboard, Fields.Freeboard),
    };

    private Opening Of(Opening opening) => opening with
    {
        SillLevel = Read(opening.SillLevel, Fields.SillLevel),
        GroundLevel = Read(opening.GroundLevel, Fields.GroundLevel),
        ClearWidth = Read(opening.ClearWidth, Fields.ClearWidth),
        ClearHeight = Read(opening.ClearHeight, Fields.ClearHeight),
        RakeDegrees = Read(opening.RakeDegrees, Fields.Rake),
        ProtectedSideLevel = Read(opening.ProtectedSideLevel, Fields.ProtectedSideLevel),
        Actions = opening.Actions with { Flow = Of(opening.Actions.Flow), Line = null },
        Barrier = Of(opening.Barrier),
    };

    private FlowInput? Of(FlowInput? flow) => flow is null ? null : new FlowInput
    {
        Velocity = Read(flow.Velocity, Fields.FlowVelocity),
        ShapeCoefficient = Read(flow.ShapeCoefficient, Fields.ShapeCoefficient),
    };

    private Barrier Of(Barrier barrier) => barrier with
    {
        Bays = barrier.Bays.Select(b => Read(b, Fields.BayWidth)).ToValueList(),
        Logs = barrier.Logs with
        {
            Material = Of((Material)barrier.Logs.Material),
            Profile = Of((Profile)barrier.Logs.Profile),
            Below = barrier.Logs.Below.Select(g => g with { Material = Of((Material)g.Material), Profile = Of((Profile)g.Profile) }).ToValueList(),
            EndBearing = Read(barrier.Logs.EndBearing, Fields.EndBearing),
            FittingClearance = Read(barrier.Logs.FittingClearance, Fields.FittingClearance),
        },
        Posts = barrier.Posts is not { } posts ? null : posts with
        {
            Material = Of((Material)posts.Material),
            Profile = Of((Profile)posts.Profile),
            Width = Read(posts.Width, Fields.PostWidth),
            Raker = Of(posts.Raker),
        },
        BasePlate = Of(barrier.BasePlate),
    };

    private RakerInput? Of(RakerInput? raker) => raker is null ? null : raker with
    {
        Material = Of((Material)raker.Material),
        Profile = Of((Profile)raker.Profile),
        HeadHeight = Read(raker.HeadHeight, RakerFields.HeadHeight),
        FootDistance = Read(raker.FootDistance, RakerFields.FootDistance),
        LengthFactor = Read(raker.LengthFactor, RakerFields.LengthFactor),
        Play = Read(raker.Play, RakerFields.Play),
        FootResistance = Read(raker.FootResistance, RakerFields.FootResistance),
    };

    private BasePlateInput? Of(BasePlateInput? plate) => plate is null ? null : plate with
    {
        Material = Of((Material)plate.Material),
        Length = Read(plate.Length, BasePlateFields.Length),
        Width = Read(plate.Width, BasePlateFields.Width),
        Thickness = Read(plate.Thickness, BasePlateFields.Thickness),
        RodDistance = Read(plate.RodDistance, BasePlateFields.RodDistance),
        ConcreteStrength = Read(plate.ConcreteStrength, BasePlateFields.ConcreteStrength),
        AreaRatio = Read(plate.AreaRatio, BasePlateFields.AreaRatio),
        GroutThickness = Read(plate.GroutThickness, BasePlateFields.GroutThickness),
        WeldLeg = Read(plate.WeldLeg, BasePlateFields.WeldLeg),
        WeldStrength = Read(plate.WeldStrength, BasePlateFields.WeldStrength),
    };

    private Material Of(Material material) => material with
    {
        Density = Read(material.Density, Fields.MaterialDensity),
        ElasticModulus = Read(material.ElasticModulus, Fields.ElasticModulus),
        BendingStrength = Read(material.BendingStrength, Fields.BendingStrength),
        ShearStrength = Read(material.ShearStrength, Fields.ShearStrength),
        AllowableBending = Read(material.AllowableBending, Fields.AllowableBending),
        AllowableShear = Read(material.AllowableShear, Fields.AllowableShear),
    };

    private Profile Of(Profile profile) => Shape(profile) with
    {
        Height = Read(profile.Height, Fields.ProfileHeight),
        Depth = Read(profile.Depth, Fields.ProfileDepth),
    };

    private Profile Shape(Profile profile) => profile switch
    {
        Rectangle solid => solid,
        HollowRectangle hollow => hollow with { Face = Read(hollow.Face, Fields.Face), Web = Read(hollow.Web, Fields.Web) },
        RectangularTube tube => tube with
        {
            Wall = Read(tube.Wall, Fields.Wall),
            CornerRadius = Read(tube.CornerRadius, Fields.CornerRadius),
            InnerRadius = Read(tube.InnerRadius, Fields.InnerRadius),
        },
        ISection section => section with { Flange = Read(section.Flange, Fields.Flange), Web = Read(section.Web, Fields.Web) },
        GivenProperties given => given with
        {
            Area = Read(given.Area, Fields.Area),
            Inertia = Read(given.Inertia, Fields.Inertia),
            Modulus = Read(given.Modulus, Fields.Modulus),
            PlasticModulus = Read(given.PlasticModulus, Fields.PlasticModulus),
            ShearArea = Read(given.ShearArea, Fields.ShearArea),
        },
        _ => throw new ArgumentOutOfRangeException(nameof(profile), profile, "is not a known shape"),
    };

    private double Read(double value, Field field) => Units.ToSI(
        double.Parse(Units.FormatInput(value, field.Dimension, system), CultureInfo.InvariantCulture), field.Dimension, system);

    private double? Read(double? value, Field field) => value is { } given ? Read(given, field) : null;
}

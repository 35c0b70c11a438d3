using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PostBases;

/// <summary>The checks of the plate itself and of the concrete under it.</summary>
internal static class PlateChecks
{
    private const string BlockEurocode = "Stress block as in AISC Design Guide 1 at the bearing strength of the Eurocode";

    /// <summary>M_f against the moment of the largest block, q·r²/2; null where nothing bears.</summary>
    public static Check? Bearing(PlateSetting setting)
    {
        if (setting.Response.Kind == BearingKind.AllTension)
        {
            return null;
        }

        if (setting.Response.Kind == BearingKind.NoTension)
        {
            return Pressure(setting);
        }

        var capacity = setting.PerLength * setting.Reach * setting.Reach / 2;
        var steps = setting.Forces();
        setting.Bearing(steps);
        steps.Add("M_c", "q·r²/2", capacity, Dimension.Moment);
        steps.Add("u", "M_f/M_c", setting.AboutRods / capacity, Dimension.Ratio);
        return new(
            "base-plate-bearing", "Bearing of the concrete under the plate", BearingSource(setting.Basis.Kind), Dimension.Moment,
            setting.AboutRods, capacity, steps.Done());
    }

    /// <summary>f_p against f_max where the concrete alone balances the moment.</summary>
    private static Check Pressure(PlateSetting setting)
    {
        var response = setting.Response;
        var steps = setting.UntilTension();
        steps.Add("u", "f_p/f_max", response.Bearing / response.BearingStrength, Dimension.Ratio);
        return new(
            "base-plate-bearing", "Bearing of the concrete under the plate", BearingSource(setting.Basis.Kind), Dimension.Stress,
            response.Bearing, response.BearingStrength, steps.Done());
    }

    private static string BearingSource(DesignBasisKind kind) =>
        $"{(kind == DesignBasisKind.Eurocode ? BlockEurocode : BasePlates.Source)}; {ConcreteBearing.Source(kind)}";

    /// <summary>Thickness needed where the concrete presses; null where nothing does.</summary>
    public static Check? PressedSide(PlateSetting setting, DesignStress stress)
    {
        var response = setting.Response;
        if (response.Kind == BearingKind.AllTension)
        {
            return null;
        }

        var overhang = PlateBending.Overhang(setting.Plate, setting.Post.Profile);
        var moment = PlateBending.PressedMoment(response.Bearing, response.BlockLength, overhang);
        var isElastic = setting.Basis.Kind == DesignBasisKind.Eurocode;
        var needed = isElastic ? PlateBending.ElasticThickness(moment, stress.Value) : PlateBending.PlasticThickness(moment, stress.Value);
        var steps = setting.UntilTension();
        steps.Given("d", setting.Post.Section.Depth, Dimension.SectionLength);
        steps.Given("b", setting.Post.Section.Height, Dimension.SectionLength);
        steps.Add(
            "l", setting.Post.Profile is ISection ? "max((N_p − 0.95·d)/2, (B − 0.80·b)/2)" : "max((N_p − 0.95·d)/2, (B − 0.95·b)/2)",
            overhang, Dimension.SectionLength);
        var isLong = response.BlockLength >= overhang;
        steps.Add("m_c", isLong ? "f_p·l²/2" : "f_p·Y·(l − Y/2)", moment, Dimension.Force);
        steps.Stress("f_b", stress);
        steps.Add("t_c", isElastic ? "√(6·m_c/f_b)" : "√(4·m_c/f_b)", needed, Dimension.SectionLength);
        var source = isElastic ? "Plate bending at the elastic moment, as the spread of EN 1993-1-8, 6.2.5(4)" : "AISC Design Guide 1, 3rd ed., 4.3";
        return Thickness("base-plate-pressed", "Plate thickness on the side that presses", source, steps, "t_c", needed, setting, stress);
    }

    /// <summary>Thickness needed on the side of the rods that pull; null where none pulls.</summary>
    public static Check? PulledSide(PlateSetting setting, DesignStress stress)
    {
        if (setting.Response.Tension <= 0)
        {
            return null;
        }

        var flange = Flange(setting.Post.Profile);
        var lever = PlateBending.PulledLever(setting.Plate.RodDistance, setting.Post.Section.Depth, flange);
        var width = PlateBending.PulledWidth(setting.Plate.Width, lever, setting.Plate.RodsPerRow);
        var moment = setting.Response.Tension * lever / width;
        var needed = PlateBending.PlasticThickness(moment, stress.Value);
        var steps = setting.UntilTension();
        steps.Given("d", setting.Post.Section.Depth, Dimension.SectionLength);
        steps.Given("t_f", flange, Dimension.SectionLength);
        steps.Add("x", "f − d/2 + t_f/2", lever, Dimension.SectionLength);
        steps.Given("n", setting.Plate.RodsPerRow, Dimension.Count);
        if (setting.Response.Kind == BearingKind.AllTension)
        {
            steps.Given("B", setting.Plate.Width, Dimension.SectionLength);
        }

        steps.Add("b_e", "min(B, 2·x·n)", width, Dimension.SectionLength);
        steps.Stress("f_b", stress);
        steps.Add("t_t", "√(4·T·x/(b_e·f_b))", needed, Dimension.SectionLength);
        return Thickness(
            "base-plate-pulled", "Plate thickness on the side of the rods", "AISC Design Guide 1, 3rd ed., 4.3", steps, "t_t", needed, setting, stress);
    }

    /// <summary>Thickness of the flange, face or wall across the water; 0 of a bar.</summary>
    private static double Flange(Profile profile) => profile switch
    {
        HollowRectangle hollow => hollow.Face,
        RectangularTube tube => tube.Wall,
        ISection section => section.Flange,
        _ => 0,
    };

    private static Check Thickness(
        string name, string title, string source, StepList steps, string symbol, double needed, PlateSetting setting, DesignStress stress)
    {
        steps.Given("t", setting.Plate.Thickness, Dimension.SectionLength);
        steps.Add("u", $"{symbol}/t", needed / setting.Plate.Thickness, Dimension.Ratio);
        return new(name, title, $"{source}; {stress.Source}", Dimension.SectionLength, needed, setting.Plate.Thickness, steps.Done());
    }
}

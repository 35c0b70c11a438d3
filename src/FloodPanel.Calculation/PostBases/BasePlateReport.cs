using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PostBases;

/// <summary>The base plates under a load case, and what their check still lacks.</summary>
internal static class BasePlateReport
{
    /// <summary>EN 1993-1-8, 6.2.5(7): grout as a part of the smaller side of the plate [-], and the thickness above which more is asked of it [m] (from memory).</summary>
    private const double MostGroutPart = 0.2, MostGrout = 0.05;

    public static IEnumerable<PartResult> Of(OpeningModel model, CaseKind _, CaseEvaluation numbers)
    {
        var results = new List<PartResult>();
        if (model.Post is not null && model.Opening.Barrier.BasePlate is { } plate && ShapeAndGrout(model, plate) is null)
        {
            for (var post = 0; post < numbers.Posts.Length; post++)
            {
                results.Add(Part(model, new(model, numbers.Posts[post]), post));
            }
        }

        return results;
    }

    public static IEnumerable<PartGap> Gaps(OpeningModel model)
    {
        if (model.Post is not { } post)
        {
            yield break;
        }

        if (model.Opening.Barrier.BasePlate is not { } plate)
        {
            yield return Gap("missing", new($"The base plates of the posts have no inputs: enter a base plate, or declare it designed by others."));
            yield break;
        }

        if (ShapeAndGrout(model, plate) is { } reason)
        {
            yield return Gap("not-covered", reason);
            yield break;
        }

        if (DesignStress.Bending(model.PlateMaterial!, model.Basis) is null)
        {
            yield return Gap("stress", new($"The base plates have no design bending stress: enter an allowable stress, or a strength that the design basis covers, with their material."));
        }

        if (WeldChecks.Lacks(plate, post.Material, model.PlateMaterial!, model.Basis.Kind) is { } lacks)
        {
            yield return Gap("weld", lacks);
        }
    }

    /// <summary>The limit of the method that is passed; null when none is.</summary>
    private static Sentence? ShapeAndGrout(OpeningModel model, BasePlateInput plate)
    {
        var post = model.Post!;
        return post.Profile is GivenProperties
                ? new($"Base plates under posts given by their properties are not covered: enter the shape of the post.")
            : post.Material.Family is not (MaterialFamily.Steel or MaterialFamily.Aluminium)
                ? new($"Base plates welded to posts of {Word(post.Material)} are not covered.")
            : model.PlateMaterial!.Family != post.Material.Family
                ? new($"Base plates of {Word(model.PlateMaterial)} under posts of {Word(post.Material)} are not covered: both must be of one family to be welded.")
            : model.Basis.Kind == DesignBasisKind.Eurocode && plate.GroutThickness > Math.Min(MostGrout, MostGroutPart * Math.Min(plate.Length, plate.Width))
                ? new($"Grout of {Section(plate.GroutThickness)} under the base plate is not covered: the bearing strength holds up to {Section(Math.Min(MostGrout, MostGroutPart * Math.Min(plate.Length, plate.Width)))}.")
            : null;
    }

    private static PartResult Part(OpeningModel model, PlateSetting setting, int post)
    {
        var checks = new List<Check?> { PlateChecks.Bearing(setting) };
        if (setting.Response.IsBalanced && DesignStress.Bending(setting.Material, model.Basis) is { } stress)
        {
            checks.Add(PlateChecks.PressedSide(setting, stress));
            checks.Add(PlateChecks.PulledSide(setting, stress));
        }

        if (WeldChecks.Lacks(setting.Plate, setting.Post.Material, setting.Material, model.Basis.Kind) is null)
        {
            checks.AddRange(WeldChecks.Of(setting));
        }

        return new(NeededChecks.BasePlates, FormattableString.Invariant($"post {post + 1}"), [.. checks.OfType<Check>()], Workings(setting));
    }

    /// <summary>What the rods must take, and the same tension by a triangular block.</summary>
    private static List<Working> Workings(PlateSetting setting)
    {
        var shear = new StepList(3);
        shear.Given("V", setting.Shear, Dimension.Force);
        shear.Given("n", setting.Plate.RodsPerRow, Dimension.Count);
        shear.Add("V_1", "V/(2·n)", setting.Response.ShearPerRod, Dimension.Force);
        var workings = new List<Working>
        {
            new("Shear of each rod", "Equal shares", shear.Done()),
        };
        if (setting.Response.Kind != BearingKind.NoTension)
        {
            workings.Insert(0, new("Tension of a row of rods", BasePlates.Source, setting.UntilTension().Done()));
        }

        if (Triangle(setting) is { } triangle)
        {
            workings.Add(triangle);
        }

        return workings;
    }

    private static Working? Triangle(PlateSetting setting)
    {
        var (plate, response) = (setting.Plate, setting.Response);
        if (response.Kind != BearingKind.StressBlock || BasePlates.TriangularLength(
                response.BearingStrength, plate.Width, setting.Reach, plate.RodDistance, -setting.Uplift, setting.Moment) is not { } length)
        {
            return null;
        }

        var steps = setting.Forces();
        setting.Bearing(steps);
        steps.Add("f_t", "q·r/2", setting.PerLength * setting.Reach / 2, Dimension.Force);
        steps.Add("A_t", "(f_t − √(f_t² − 4·q/6·M_f))/(q/3)", length, Dimension.SectionLength);
        steps.Add("T_t", "q·A_t/2 + T_u", setting.PerLength * length / 2 + setting.Uplift, Dimension.Force);
        return new("Tension of a row of rods by a triangular block, for comparison", "AISC Design Guide 1, 2nd ed. (2006), appendix B", steps.Done());
    }

    private static PartGap Gap(string code, Sentence text) => new(NeededChecks.BasePlates, new($"base-plates-{code}", text));

    private static string Word(Material material) => material.Family.ToString().ToLowerInvariant();

    private static Quantity Section(double value) => new(value, Dimension.SectionLength);
}

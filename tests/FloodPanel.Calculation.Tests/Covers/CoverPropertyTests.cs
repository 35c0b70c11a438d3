using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FloodPanel.Calculation.Tests.Steps;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Covers;

/// <summary>What holds for every cover: its steps, and that a thicker or a smaller plate is never used more.</summary>
[Properties(Arbitrary = [typeof(AnyCover)], MaxTest = 60)]
public class CoverPropertyTests
{
    [Property]
    public Property Steps_AnyCover_EveryLineHolds(Cover cover)
    {
        var result = SampleCovers.Evaluate(cover);

        var complaints = result.Checks.SelectMany(StepAudit.Complaints)
            .Concat(result.Workings.SelectMany(w => StepAudit.Complaints(w.Title, w.Steps))).Take(3).ToArray();

        return (complaints.Length == 0).Label(string.Join("\n", complaints));
    }

    [Property]
    public void Evaluate_AnyCover_FiniteFiguresAndOneVerdict(Cover cover)
    {
        var result = SampleCovers.Evaluate(cover);

        Assert.All(result.Checks, c => Assert.True(double.IsFinite(c.Utilisation) && c.Utilisation >= 0, c.Name));
        Assert.Equal(result.Kind == VerdictKind.Inadequate, result.Checks.Any(c => !c.Passes));
        Assert.Equal(result.Kind == VerdictKind.Incomplete, result.Checks.All(c => c.Passes) && result.Gaps.Count > 0);
        Assert.StartsWith($"{result.Kind}.", result.Sentence.ToString());
    }

    [Property]
    public void Evaluate_ThickerPlate_NeverUsedMore(Cover cover, PositiveInt more) =>
        NeverMore(cover, cover with { Thickness = cover.Thickness * (1 + more.Get % 40 / 20.0) });

    /// <summary>Smaller all round, its lowest point where it was.</summary>
    [Property]
    public void Evaluate_SmallerPlate_NeverUsedMore(Cover cover, PositiveInt less)
    {
        var factor = 1 / (1 + less.Get % 40 / 20.0);
        var smaller = cover.Plate switch
        {
            CircleCover circle => cover with
            {
                Plate = circle with { Diameter = circle.Diameter * factor },
                Level = cover.Position == CoverPosition.Flat ? cover.Level : cover.Level - circle.Diameter * (1 - factor) / 2,
            },
            RectangleCover plate => cover with { Plate = plate with { Width = plate.Width * factor, Height = plate.Height * factor } },
            _ => throw new InvalidOperationException(),
        };

        NeverMore(cover, smaller);
    }

    private static void NeverMore(Cover cover, Cover better)
    {
        var (before, after) = (SampleCovers.Evaluate(cover), SampleCovers.Evaluate(better));

        Assert.All(after.Checks, check => Assert.True(check.Utilisation <= before.Use(check.Name) * (1 + 1e-6), check.Name));
    }

    /// <summary>Covers of every kind, upright and flat, dry, partly and wholly under water.</summary>
    private static class AnyCover
    {
        public static Arbitrary<Cover> Covers() => (
            from plate in Gen.OneOf(Rectangles, Circles)
            from position in Gen.Elements(Enum.GetValues<CoverPosition>())
            from level in Numbers.From(6, 10.2)
            from material in Members.Material
            from thickness in Numbers.From(0.002, 0.02)
            from poisson in Numbers.From(0, 0.49, 0.01)
            from pressing in Gen.Elements(Enum.GetValues<CoverPressing>())
            from fasteners in Fasteners
            select new Cover
            {
                Name = "any",
                Plate = plate,
                Position = position,
                Level = level,
                Material = material with { Family = thickness > 0.004 ? MaterialFamily.Steel : material.Family },
                Thickness = thickness,
                PoissonRatio = poisson,
                Pressing = pressing,
                Fasteners = fasteners,
            }).ToArbitrary();

        private static Gen<CoverPlate> Rectangles =>
            from width in Numbers.From(0.2, 1.5)
            from height in Numbers.From(0.2, 1.5)
            from support in Gen.Elements(Enum.GetValues<RectangleSupport>())
            select (CoverPlate)new RectangleCover { Width = width, Height = height, Support = support };

        private static Gen<CoverPlate> Circles =>
            from diameter in Numbers.From(0.1, 1.5)
            from support in Gen.Elements(Enum.GetValues<CircleSupport>())
            select (CoverPlate)new CircleCover { Diameter = diameter, Support = support };

        private static Gen<CoverFasteners> Fasteners =>
            from pitch in Numbers.From(0.03, 0.4)
            from gasket in Gen.OneOf(Gen.Constant(0.0), Numbers.From(0, 5000, 10))
            from lever in Numbers.Perhaps(Numbers.From(0.01, 0.1))
            from tension in Numbers.Perhaps(Numbers.From(500, 50_000, 10))
            from source in Gen.Elements("", "Approval 7 (invented)")
            select new CoverFasteners { Pitch = pitch, GasketLoad = gasket, FixingLever = lever, Tension = tension, Source = source };
    }
}

using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in rakers and base plates, and in how they fit the posts and the barrier.</summary>
internal static class PostBaseValidation
{
    public static void Validate(Opening opening, string path, ProblemList problems, Library library)
    {
        if (opening.Barrier.Posts?.Raker is { } raker)
        {
            Raker(opening, raker, $"{path}.posts.raker", problems, library);
        }

        if (opening.Barrier.BasePlate is { } plate)
        {
            Plate(opening, plate, $"{path}.basePlate", problems, library);
        }
    }

    private static void Raker(Opening opening, RakerInput raker, string path, ProblemList problems, Library library)
    {
        ChoiceValidation.Material(raker.Material, $"{path}.material", problems, library);
        ChoiceValidation.Profile(raker.Profile, $"{path}.profile", problems, library);
        var head = problems.Check(RakerFields.HeadHeight, raker.HeadHeight, path);
        var foot = problems.Check(RakerFields.FootDistance, raker.FootDistance, path);
        problems.Check(RakerFields.LengthFactor, raker.LengthFactor, path);
        problems.Check(RakerFields.Play, raker.Play, path);
        problems.Check(RakerFields.FootResistance, raker.FootResistance, path);
        if (head && BarrierHeight.Of(opening, library) is { } height && raker.HeadHeight > height + FloodLevels.HeightTolerance)
        {
            problems.Add($"{path}.headHeight", $"Height of the head is {Length(raker.HeadHeight):typed}; allowed is up to the top of the barrier, {Length(height)}.");
        }

        var lean = raker.HeadHeight * Math.Tan(double.DegreesToRadians(opening.RakeDegrees));
        if (head && foot && Fields.Rake.Allows(opening.RakeDegrees) && raker.FootDistance <= lean)
        {
            problems.Add($"{path}.footDistance", $"Distance of the foot is {Length(raker.FootDistance):typed}; allowed is more than the head leans over, {Length(lean)}, or the raker does not push against the water.");
        }
    }

    private static void Plate(Opening opening, BasePlateInput plate, string path, ProblemList problems, Library library)
    {
        ChoiceValidation.Material(plate.Material, $"{path}.material", problems, library);
        var length = problems.Check(BasePlateFields.Length, plate.Length, path);
        var width = problems.Check(BasePlateFields.Width, plate.Width, path);
        problems.Check(BasePlateFields.Thickness, plate.Thickness, path);
        var rods = problems.Check(BasePlateFields.RodDistance, plate.RodDistance, path);
        problems.Check(BasePlateFields.RodsPerRow, plate.RodsPerRow, path);
        problems.Check(BasePlateFields.ConcreteStrength, plate.ConcreteStrength, path);
        problems.Check(BasePlateFields.AreaRatio, plate.AreaRatio, path);
        problems.Check(BasePlateFields.GroutThickness, plate.GroutThickness, path);
        problems.Check(BasePlateFields.WeldLeg, plate.WeldLeg, path);
        problems.Check(BasePlateFields.WeldStrength, plate.WeldStrength, path);
        if (length && rods && plate.RodDistance >= plate.Length / 2)
        {
            problems.Add($"{path}.rodDistance", $"Distance of the rods from the middle is {Section(plate.RodDistance):typed}; allowed is less than half of the plate length, {Section(plate.Length / 2):typed}.");
        }

        if (opening.Barrier.Posts is not { } posts || library.Find(posts.Profile) is not { } post
            || !Fields.ProfileDepth.Allows(post.Depth) || !Fields.ProfileHeight.Allows(post.Height))
        {
            // A post that is refused itself says nothing about its plate.
            return;
        }

        if (length && plate.Length < post.Depth)
        {
            problems.Add($"{path}.length", $"Plate length N is {Section(plate.Length):typed}; allowed is at least the depth of the post, {Section(post.Depth):typed}.");
        }

        if (width && plate.Width < post.Height)
        {
            problems.Add($"{path}.width", $"Plate width B is {Section(plate.Width):typed}; allowed is at least the width of the post, {Section(post.Height):typed}.");
        }

        if (rods && plate.RodDistance <= post.Depth / 2)
        {
            problems.Add($"{path}.rodDistance", $"Distance of the rods from the middle is {Section(plate.RodDistance):typed}; allowed is more than half of the depth of the post, {Section(post.Depth / 2):typed}: rods beside the post are not covered.");
        }
    }

    private static Quantity Length(double value) => new(value, Dimension.Length);

    private static Quantity Section(double value) => new(value, Dimension.SectionLength);
}

namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in a choice of material or profile.</summary>
internal static class ChoiceValidation
{
    public static void Material(MaterialChoice choice, string path, ProblemList problems, Library library)
    {
        if (choice is LibraryMaterial named && library.Find(named) is null)
        {
            problems.Add(path, $"Material is \"{named.Id}\", which the library does not hold; choose one it holds or give the figures.");
        }

        if (choice is not Material material)
        {
            return;
        }

        problems.Check(Fields.MaterialDensity, material.Density, path);
        problems.Check(Fields.ElasticModulus, material.ElasticModulus, path);
        problems.Check(Fields.BendingStrength, material.BendingStrength, path);
        problems.Check(Fields.ShearStrength, material.ShearStrength, path);
        problems.Check(Fields.AllowableBending, material.AllowableBending, path);
        problems.Check(Fields.AllowableShear, material.AllowableShear, path);
        problems.Check(MaterialFields.UltimateStrength, material.UltimateStrength, path);
        problems.Check(MaterialFields.WeldedYield, material.WeldedYield, path);
        problems.Check(MaterialFields.WeldedUltimate, material.WeldedUltimate, path);
        problems.Check(MaterialFields.ShearModulus, material.ShearModulus, path);
        problems.Check(MaterialFields.CrossStrength, material.CrossStrength, path);
        problems.Check(MaterialFields.CrossCompression, material.CrossCompression, path);
        problems.Check(MaterialFields.CharacteristicDensity, material.CharacteristicDensity, path);
    }

    public static void Profile(ProfileChoice choice, string path, ProblemList problems, Library library)
    {
        if (choice is LibraryProfile named && library.Find(named) is null)
        {
            problems.Add(path, $"Profile is \"{named.Id}\", which the library does not hold; choose one it holds or give the dimensions.");
        }

        if (choice is not Profile profile)
        {
            return;
        }

        problems.Check(Fields.ProfileHeight, profile.Height, path);
        problems.Check(Fields.ProfileDepth, profile.Depth, path);
        switch (profile)
        {
            case HollowRectangle hollow:
                Hollow(hollow, path, problems);
                break;
            case RectangularTube tube:
                Tube(tube, path, problems);
                break;
            case ISection section:
                problems.Check(Fields.Flange, section.Flange, path);
                problems.Check(Fields.Web, section.Web, path);
                Fits(2 * section.Flange, section.Depth, $"{path}.flange", "Two flanges together are", "the depth", problems);
                Fits(section.Web, section.Height, $"{path}.web", "The web is", "the height", problems);
                break;
            case GivenProperties given:
                problems.Check(Fields.Area, given.Area, path);
                problems.Check(Fields.Inertia, given.Inertia, path);
                problems.Check(Fields.Modulus, given.Modulus, path);
                problems.Check(Fields.PlasticModulus, given.PlasticModulus, path);
                problems.Check(Fields.ShearArea, given.ShearArea, path);
                break;
        }
    }

    private static void Hollow(HollowRectangle hollow, string path, ProblemList problems)
    {
        problems.Check(Fields.Face, hollow.Face, path);
        problems.Check(Fields.Web, hollow.Web, path);
        problems.Check(Fields.Webs, hollow.Webs, path);
        Fits(2 * hollow.Face, hollow.Depth, $"{path}.face", "Two faces together are", "the depth", problems);
        Fits(hollow.Webs * hollow.Web, hollow.Height, $"{path}.web", "The webs together are", "the height", problems);
    }

    private static void Tube(RectangularTube tube, string path, ProblemList problems)
    {
        var side = Math.Min(tube.Height, tube.Depth);
        problems.Check(Fields.Wall, tube.Wall, path);
        problems.Check(Fields.CornerRadius, tube.CornerRadius, path);
        problems.Check(Fields.InnerRadius, tube.InnerRadius, path);
        Fits(2 * tube.Wall, side, $"{path}.wall", "Two walls together are", "the smaller side", problems);
        Fits(tube.OuterCorner, side / 2, $"{path}.cornerRadius", "The outer corner radius is", "half the smaller side", problems);
        if (tube.InnerRadius is not { } inner)
        {
            return;
        }

        // Less would leave the wall thinner in the corner than along the sides; a tenth of a millimetre is rounding.
        var least = tube.OuterCorner - tube.Wall;
        Fits(inner, side / 2 - tube.Wall, $"{path}.innerRadius", "The inner corner radius is", "half the hollow", problems);
        if (inner < least - 1e-4)
        {
            problems.Add($"{path}.innerRadius", $"The inner corner radius is {Section(inner)}; allowed is at least the outer radius less the wall, {Section(least)}.");
        }
    }

    private static void Fits(
        double parts, double whole, string path, string partsAre, string wholeName, ProblemList problems)
    {
        if (!(parts < whole) && whole > 0)
        {
            problems.Add(path, $"{partsAre} {Section(parts)}; allowed is less than {wholeName}, {Section(whole)}.");
        }
    }

    private static Quantity Section(double value) => new(value, Dimension.SectionLength);
}

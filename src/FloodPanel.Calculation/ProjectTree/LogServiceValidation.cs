namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in the joints and the service of logs.</summary>
internal static class LogServiceValidation
{
    public static void Validate(LogStack logs, string path, ProblemList problems)
    {
        if (logs.Joint is { } joint)
        {
            problems.Check(LogServiceFields.Travel, joint.Travel, $"{path}.joint");
            problems.Check(LogServiceFields.SealCompression, joint.SealCompression, $"{path}.joint");
        }

        if (logs.Timber is { } timber)
        {
            problems.Check(LogServiceFields.SizeFactor, timber.SizeFactor, $"{path}.timber");
        }

        if (logs.Composite is { } composite)
        {
            problems.Check(LogServiceFields.MaterialFactor, composite.MaterialFactor, $"{path}.composite");
            problems.Check(LogServiceFields.ConversionFactor, composite.ConversionFactor, $"{path}.composite");
        }
    }
}

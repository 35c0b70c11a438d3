namespace FloodPanel.Storage.ProjectFile;

/// <summary>Reads a design basis: the same fields in a project file and in design-bases.json.</summary>
internal static class BasisReader
{
    /// <summary>The basis; its object is closed.</summary>
    /// <param name="basis">The object.</param>
    /// <param name="kind">Which basis it is, or was copied from.</param>
    public static DesignBasis Read(FileObject basis, DesignBasisKind kind)
    {
        var read = new DesignBasis(
            kind,
            basis.Text("title"),
            basis.Text("loadSource"),
            ReadFactors(basis, "inland"),
            ReadFactors(basis, "coastal"),
            basis.List("strengths").Select(ReadStrength).ToValueList());
        basis.Close();
        return read;
    }

    private static LoadFactors ReadFactors(FileObject basis, string name)
    {
        if (basis.NeededObject(name) is not { } factors)
        {
            return new(1, 1, 1, 1, 1, 1);
        }

        var read = new LoadFactors(
            factors.Number("floodSide"),
            factors.Number("protectedSide"),
            factors.Number("brimFull"),
            factors.Number("debris"),
            factors.Number("wind"),
            factors.Number("line"));
        factors.Close();
        return read;
    }

    private static StrengthRule ReadStrength(FileValue value)
    {
        if (value.AsObject() is not { } rule)
        {
            return new(default, 1, 1, "");
        }

        var read = new StrengthRule(
            rule.Word("family", FileWords.Family),
            rule.Number("multiplier"),
            rule.Number("divisor"),
            rule.Text("source"));
        rule.Close();
        return read;
    }
}

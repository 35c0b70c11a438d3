namespace FloodPanel.Calculation.Actions;

/// <summary>Writes the integrals of a pressure diagram as steps.</summary>
internal static class DiagramWorking
{
    private const string Source = "Integral of the pressure diagram";

    /// <summary>Working of an unfactored resultant and its height.</summary>
    public static Working Resultant(string title, PressureDiagram diagram, double rake)
    {
        var steps = new List<CalculationStep>();
        AddRake(steps, rake);
        AddForces(steps, diagram.Pieces, rake, withArms: true, withFactors: false);
        var count = diagram.Pieces.Length;
        var resultant = diagram.Force / Math.Cos(rake);
        steps.Add(new("R", PieceSymbols.SumOfForces(count), resultant, Dimension.LineForce));
        if (diagram.CentreOfPressure is { } centre)
        {
            var moments = PieceSymbols.Sum(count, n => $"w_{n}·z_{n}");
            steps.Add(new("z_R", $"({moments})/R", centre, Dimension.Length));
        }

        return new(title, Source, steps);
    }

    /// <summary>Working of a line load as a resultant: the force itself, at its height.</summary>
    public static Working Resultant(string title, ConcentratedForce line) => new(title, "The line load itself",
    [
        new("R", "", line.Characteristic, Dimension.LineForce),
        new("z_R", "", line.Height, Dimension.Length),
    ]);

    /// <summary>Working of the line load on a log between two heights.</summary>
    /// <param name="title">Title of the working.</param>
    /// <param name="pieces">The pressure of the case.</param>
    /// <param name="bottom">Lower edge of the log [m].</param>
    /// <param name="top">Upper edge of the log [m].</param>
    /// <param name="rake">θ [rad].</param>
    /// <param name="load">The line load that the steps must end in.</param>
    /// <param name="line">A line load that the log takes besides; null for none.</param>
    public static Working LineLoad(
        string title,
        ReadOnlySpan<PressurePiece> pieces,
        double bottom,
        double top,
        double rake,
        FactoredLoad load,
        ConcentratedForce? line)
    {
        Span<PressurePiece> parts = stackalloc PressurePiece[pieces.Length];
        var count = 0;
        foreach (ref readonly var piece in pieces)
        {
            if (piece.Bottom < top && piece.Top > bottom)
            {
                parts[count++] = piece.Within(bottom, top);
            }
        }

        var steps = new List<CalculationStep>(6 * count + 3);
        AddRake(steps, rake);
        AddForces(steps, parts[..count], rake, withArms: false, withFactors: true);
        if (line is { } force)
        {
            steps.Add(new("w_L", "", force.Characteristic, Dimension.LineForce));
            steps.Add(new("γ_L", "", force.Factor, Dimension.Ratio));
        }

        var (own, ownDesign) = line is null ? ("", "") : ("w_L", "γ_L·w_L");
        steps.Add(new("w_k", Joined(PieceSymbols.SumOfForces(count), own), load.Characteristic, Dimension.LineForce));
        steps.Add(new("w", Joined(PieceSymbols.SumOfDesignForces(count), ownDesign), load.Design, Dimension.LineForce));
        return new(title, Source, steps);
    }

    /// <summary>Two terms with a plus sign between them, or the one that is there.</summary>
    public static string Joined(string first, string second) =>
        first.Length > 0 && second.Length > 0 ? $"{first} + {second}" : first + second;

    /// <summary>θ as a given value, where the face is raked.</summary>
    public static void AddRake(List<CalculationStep> steps, double rake)
    {
        if (rake != 0)
        {
            steps.Add(new("θ", "", rake, Dimension.Angle));
        }
    }

    /// <summary>For each piece: its ends and pressures, its factor, its force along the face, its arm.</summary>
    public static void AddForces(
        List<CalculationStep> steps, ReadOnlySpan<PressurePiece> pieces, double rake, bool withArms, bool withFactors)
    {
        var toSlope = 1 / Math.Cos(rake);
        for (var i = 0; i < pieces.Length; i++)
        {
            var symbols = PieceSymbols.At(i);
            ref readonly var piece = ref pieces[i];
            steps.Add(new(symbols.From, "", piece.Bottom, Dimension.Length));
            steps.Add(new(symbols.To, "", piece.Top, Dimension.Length));
            steps.Add(new(symbols.AtFrom, "", piece.AtBottom, Dimension.Pressure));
            steps.Add(new(symbols.AtTo, "", piece.AtTop, Dimension.Pressure));
            if (withFactors)
            {
                steps.Add(new(symbols.Factor, "", piece.Factor, Dimension.Ratio));
            }

            var formula = rake == 0 ? symbols.ForceFormula : symbols.RakedForceFormula;
            steps.Add(new(symbols.Force, formula, piece.Force * toSlope, Dimension.LineForce));
            if (withArms)
            {
                steps.Add(new(symbols.Arm, symbols.ArmFormula, piece.FirstMoment / piece.Force, Dimension.Length));
            }
        }
    }
}

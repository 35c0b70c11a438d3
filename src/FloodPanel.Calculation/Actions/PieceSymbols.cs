namespace FloodPanel.Calculation.Actions;

/// <summary>Symbols and formulas of one piece of the diagram in a working, numbered from 1; made once.</summary>
internal sealed class PieceSymbols
{
    private const int Most = 16;

    private static readonly PieceSymbols[] Numbered = [.. Enumerable.Range(1, Most).Select(n => new PieceSymbols(n))];

    private static readonly string[] Sums = [.. Enumerable.Range(0, Most + 1).Select(n => Sum(n, i => $"w_{i}"))];

    private static readonly string[] FactoredSums =
        [.. Enumerable.Range(0, Most + 1).Select(n => Sum(n, i => $"γ_{i}·w_{i}"))];

    private PieceSymbols(int n)
    {
        Factor = $"γ_{n}";
        From = $"z_a{n}";
        To = $"z_b{n}";
        AtFrom = $"p_a{n}";
        AtTo = $"p_b{n}";
        Force = $"w_{n}";
        Arm = $"z_{n}";
        Second = $"S_{n}";
        Third = $"T_{n}";
        Tip = $"J_{n}";
        ForceFormula = $"(p_a{n} + p_b{n})/2·(z_b{n} − z_a{n})";
        RakedForceFormula = $"(p_a{n} + p_b{n})/2·(z_b{n} − z_a{n})/cos(θ)";
        ArmFormula = $"z_a{n} + (z_b{n} − z_a{n})/3·(p_a{n} + 2·p_b{n})/(p_a{n} + p_b{n})";
        SecondFormula = $"(z_b{n} − z_a{n})/12·(p_a{n}·(3·z_a{n}² + 2·z_a{n}·z_b{n} + z_b{n}²)"
            + $" + p_b{n}·(z_a{n}² + 2·z_a{n}·z_b{n} + 3·z_b{n}²))";
        ThirdFormula = $"(z_b{n} − z_a{n})/20·(p_a{n}·(4·z_a{n}³ + 3·z_a{n}²·z_b{n} + 2·z_a{n}·z_b{n}² + z_b{n}³)"
            + $" + p_b{n}·(z_a{n}³ + 2·z_a{n}²·z_b{n} + 3·z_a{n}·z_b{n}² + 4·z_b{n}³))";
        VerticalTipFormula = $"3·ℓ·S_{n} − T_{n}";
        TipFormula = $"(3·ℓ·S_{n} − T_{n}/cos(θ))/cos(θ)³";
    }

    public string Factor { get; }

    public string From { get; }

    public string To { get; }

    public string AtFrom { get; }

    public string AtTo { get; }

    public string Force { get; }

    public string Arm { get; }

    public string Second { get; }

    public string Third { get; }

    public string Tip { get; }

    public string ForceFormula { get; }

    public string RakedForceFormula { get; }

    public string ArmFormula { get; }

    public string SecondFormula { get; }

    public string ThirdFormula { get; }

    public string TipFormula { get; }

    public string VerticalTipFormula { get; }

    public static PieceSymbols At(int index) => Numbered[index];

    /// <summary>"w_1 + w_2", for a count of pieces.</summary>
    public static string SumOfForces(int count) => Sums[count];

    /// <summary>"γ_1·w_1 + γ_2·w_2", for a count of pieces.</summary>
    public static string SumOfDesignForces(int count) => FactoredSums[count];

    /// <summary>Terms for each piece joined by plus signs.</summary>
    public static string Sum(int count, Func<int, string> term) =>
        string.Join(" + ", Enumerable.Range(1, count).Select(term));
}

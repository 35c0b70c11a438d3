namespace FloodPanel.Web.Pages.Bench.Loads;

/// <summary>Risk categories of a building after ASCE 7, in words.</summary>
internal static class RiskCategories
{
    public static readonly int[] All = [1, 2, 3, 4];

    public static string Words(int category) => category switch
    {
        1 => "1, low risk to people",
        2 => "2, usual buildings",
        3 => "3, many people",
        4 => "4, essential in a disaster",
        _ => throw new ArgumentOutOfRangeException(nameof(category), category, "is not 1 to 4"),
    };
}

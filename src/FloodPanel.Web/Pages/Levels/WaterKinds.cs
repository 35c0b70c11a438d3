namespace FloodPanel.Web.Pages.Levels;

/// <summary>Densities that are taken where none was measured [kg/m³].</summary>
public static class WaterKinds
{
    public const double Fresh = 1000;
    public const double Sea = 1025;

    public static IReadOnlyList<double> Usual { get; } = [Fresh, Sea];

    public static string Name(double density) => density == Sea ? "Sea" : "Fresh";
}

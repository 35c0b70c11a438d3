using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Levels;

public static class RequiredTop
{
    /// <summary>Level that the top of every barrier must reach: design flood level and freeboard [m].</summary>
    public static double Of(Site site) => site.DesignFloodLevel + site.Freeboard;
}

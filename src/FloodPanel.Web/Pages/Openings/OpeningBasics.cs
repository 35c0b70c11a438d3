namespace FloodPanel.Web.Pages.Openings;

/// <summary>What is known of an opening when it is added [m].</summary>
public sealed record OpeningBasics(string Name, double SillLevel, double ClearWidth, double ClearHeight);

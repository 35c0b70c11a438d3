using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Covers;

/// <summary>One edit of a cover.</summary>
/// <param name="What">What is edited, as undo names it.</param>
/// <param name="Apply">The cover after it.</param>
public sealed record CoverEdit(string What, Func<Cover, Cover> Apply);

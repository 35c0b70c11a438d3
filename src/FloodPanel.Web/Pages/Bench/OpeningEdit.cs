using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>One edit of an opening.</summary>
/// <param name="What">What is edited, as undo names it.</param>
/// <param name="Apply">The opening after it.</param>
public sealed record OpeningEdit(string What, Func<Opening, Opening> Apply);

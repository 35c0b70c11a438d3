namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Something in the inputs that the calculation cannot take. Shown at the field; nothing is lost.</summary>
/// <param name="Path">Path in the project file, "openings[0].barrier.logs.count".</param>
/// <param name="Message">A sentence with the field, the value and what is allowed.</param>
public sealed record InputProblem(string Path, Sentence Message);

using System.Collections;

namespace FloodPanel.Calculation;

/// <summary>The steps of a check, written when somebody reads them first: most checks are judged and never opened.</summary>
/// <param name="write">Writes the steps.</param>
internal sealed class DeferredSteps(Func<IReadOnlyList<CalculationStep>> write) : IReadOnlyList<CalculationStep>
{
    private IReadOnlyList<CalculationStep>? written;

    public int Count => Written.Count;

    // Two readers at a time write the same steps twice, and either may stay.
    private IReadOnlyList<CalculationStep> Written => written ??= write();

    public CalculationStep this[int index] => Written[index];

    public IEnumerator<CalculationStep> GetEnumerator() => Written.GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();
}

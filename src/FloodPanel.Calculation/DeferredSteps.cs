using System.Collections;

namespace FloodPanel.Calculation;

/// <summary>The steps of a check, written when somebody reads them first: most checks are judged and never opened.</summary>
/// <param name="setting">What the steps are written from.</param>
/// <param name="write">Writes the steps; best static, so that nothing is made for a check that stays closed.</param>
/// <typeparam name="T">Immutable: steps may be written long after the check was made.</typeparam>
internal sealed class DeferredSteps<T>(T setting, Func<T, IReadOnlyList<CalculationStep>> write) : IReadOnlyList<CalculationStep>
{
    private IReadOnlyList<CalculationStep>? written;

    public int Count => Written.Count;

    // Two readers at a time write the same steps twice, and either may stay.
    private IReadOnlyList<CalculationStep> Written => written ??= write(setting);

    public CalculationStep this[int index] => Written[index];

    public IEnumerator<CalculationStep> GetEnumerator() => Written.GetEnumerator();

    IEnumerator IEnumerable.GetEnumerator() => GetEnumerator();
}

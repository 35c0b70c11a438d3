using Microsoft.Playwright;

namespace FloodPanel.Browser.Tests;

/// <summary>Time from a key press to the changed result on the screen, taken by the browser itself.</summary>
internal static class KeyPressTimes
{
    // From the key's event to the first frame after the watched element has changed.
    private const string Install = """
        selector => {
          window.keyPressTimes = [];
          let pressed = 0;
          document.addEventListener('keydown', () => pressed = performance.now(), true);
          new MutationObserver(() => {
            if (pressed === 0) return;
            const since = pressed;
            pressed = 0;
            requestAnimationFrame(() => window.keyPressTimes.push(performance.now() - since));
          }).observe(document.querySelector(selector), { subtree: true, childList: true, characterData: true, attributes: true });
        }
        """;

    /// <summary>Presses two keys in turn at the end of a field and waits each time until the element has changed [ms, ascending].</summary>
    public static async Task<double[]> MeasureAsync(IPage page, string field, string watched, int presses)
    {
        await page.GetByTestId(field).FocusAsync();
        await page.Keyboard.PressAsync("End");
        await page.EvaluateAsync(Install, watched);
        for (var i = 0; i < presses; i++)
        {
            await page.Keyboard.PressAsync(i % 2 == 0 ? "5" : "Backspace");
            await page.WaitForFunctionAsync("count => window.keyPressTimes.length > count", i);
        }

        var times = await page.EvaluateAsync<double[]>("() => window.keyPressTimes");
        return [.. times.Order()];
    }
}

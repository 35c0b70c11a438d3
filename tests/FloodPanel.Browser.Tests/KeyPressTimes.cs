using Microsoft.Playwright;

namespace FloodPanel.Browser.Tests;

/// <summary>Time from a key press to the changed result on the screen, taken by the browser itself.</summary>
internal static class KeyPressTimes
{
    // From the key's event to the first frame that shows other words in the watched element than before the key. What a
    // late render of an earlier key does to the element without changing its words does not count.
    private const string Install = """
        selector => {
          const watched = document.querySelector(selector);
          let pressed = 0;
          window.keyPressTimes = [];
          window.wordsBefore = watched.textContent;
          window.armKeyPress = () => { window.wordsBefore = watched.textContent; pressed = 0; };
          document.addEventListener('keydown', () => pressed = performance.now(), true);
          new MutationObserver(() => {
            if (pressed === 0 || watched.textContent === window.wordsBefore) return;
            const since = pressed;
            pressed = 0;
            requestAnimationFrame(() => window.keyPressTimes.push(performance.now() - since));
          }).observe(watched, { subtree: true, childList: true, characterData: true, attributes: true });
        }
        """;

    // A frame that a busy machine never shows is not measured, and the report says how many were.
    private const string Await = """
        count => new Promise(done => {
          const until = performance.now() + 5000;
          const look = () => window.keyPressTimes.length > count ? done(true)
            : performance.now() > until ? done(false)
            : setTimeout(look, 5);
          look();
        })
        """;

    /// <summary>Presses two keys in turn at the end of a field and waits each time until the element has changed [ms, ascending].</summary>
    public static async Task<double[]> MeasureAsync(IPage page, string field, string watched, int presses)
    {
        await page.GetByTestId(field).FocusAsync();
        await page.Keyboard.PressAsync("End");
        await page.EvaluateAsync(Install, watched);
        var measured = 0;
        for (var i = 0; i < presses; i++)
        {
            await page.EvaluateAsync("() => window.armKeyPress()");
            await page.Keyboard.PressAsync(i % 2 == 0 ? "5" : "Backspace");
            measured += await page.EvaluateAsync<bool>(Await, measured) ? 1 : 0;
        }

        var times = await page.EvaluateAsync<double[]>("() => window.keyPressTimes");
        return [.. times.Order()];
    }
}

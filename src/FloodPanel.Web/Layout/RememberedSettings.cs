using FloodPanel.Calculation;
using FloodPanel.Web.Editing;

namespace FloodPanel.Web.Layout;

/// <summary>The cookies in which a browser remembers its settings; written by wwwroot/js/floodpanel.js.</summary>
public static class RememberedSettings
{
    public const string UnitsCookie = "fp-units";
    public const string ThemeCookie = "fp-theme";
    public const string SystemCookie = "fp-system";

    public static UnitSystem Units(IRequestCookieCollection cookies) =>
        cookies[UnitsCookie] == "us" ? UnitSystem.USCustomary : UnitSystem.SI;

    public static ThemeChoice Theme(IRequestCookieCollection cookies) => cookies[ThemeCookie] switch
    {
        "light" => ThemeChoice.Light,
        "dark" => ThemeChoice.Dark,
        _ => ThemeChoice.System,
    };

    public static bool SystemIsDark(IRequestCookieCollection cookies) => cookies[SystemCookie] == "dark";

    public static string Word(UnitSystem units) => units == UnitSystem.SI ? "si" : "us";

    public static string Word(ThemeChoice theme) => theme switch
    {
        ThemeChoice.Light => "light",
        ThemeChoice.Dark => "dark",
        _ => "system",
    };
}

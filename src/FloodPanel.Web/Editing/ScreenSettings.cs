using FloodPanel.Calculation;

namespace FloodPanel.Web.Editing;

/// <summary>Light, dark, or as the system asks.</summary>
public enum ThemeChoice
{
    System,
    Light,
    Dark,
}

/// <summary>How one person wants to see things: units and light. Remembered by their browser, not by the project.</summary>
public sealed class ScreenSettings
{
    public UnitSystem Units { get; private set; }

    public ThemeChoice Theme { get; private set; }

    /// <summary>What the system asks for, as the browser last reported it.</summary>
    public bool SystemIsDark { get; private set; }

    public bool IsDark => Theme == ThemeChoice.Dark || (Theme == ThemeChoice.System && SystemIsDark);

    public event Action? Changed;

    /// <summary>Takes over what the browser remembered, before anything is shown.</summary>
    public void Start(UnitSystem units, ThemeChoice theme, bool systemIsDark) =>
        (Units, Theme, SystemIsDark) = (units, theme, systemIsDark);

    public void Use(UnitSystem units)
    {
        Units = units;
        Changed?.Invoke();
    }

    public void Use(ThemeChoice theme)
    {
        Theme = theme;
        Changed?.Invoke();
    }

    public void ReportSystem(bool isDark)
    {
        SystemIsDark = isDark;
        Changed?.Invoke();
    }
}

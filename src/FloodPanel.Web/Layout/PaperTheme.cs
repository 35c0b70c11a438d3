using MudBlazor;

namespace FloodPanel.Web.Layout;

/// <summary>Ink on paper and chalk on slate, with one colour of water.</summary>
public static class PaperTheme
{
    private static readonly string[] Family = ["Source Sans 3", "Segoe UI", "Helvetica Neue", "Arial", "sans-serif"];

    public static MudTheme Theme { get; } = new()
    {
        PaletteLight = new PaletteLight
        {
            Black = "#16202a",
            White = "#ffffff",
            Background = "#f4f2ec",
            BackgroundGray = "#ebe8df",
            Surface = "#fcfbf8",
            AppbarBackground = "#fcfbf8",
            AppbarText = "#16202a",
            DrawerBackground = "#fcfbf8",
            DrawerText = "#16202a",
            DrawerIcon = "#48545f",
            TextPrimary = "#16202a",
            TextSecondary = "#48545f",
            TextDisabled = "#7b858d",
            ActionDefault = "#48545f",
            ActionDisabled = "#8d969d",
            ActionDisabledBackground = "#e2dfd6",
            Primary = "#0072b2",
            PrimaryContrastText = "#ffffff",
            PrimaryDarken = "#005a8e",
            PrimaryLighten = "#2b8cc4",
            Secondary = "#48545f",
            SecondaryContrastText = "#ffffff",
            Info = "#0072b2",
            Success = "#00704f",
            Warning = "#8a5800",
            Error = "#b13e00",
            LinesDefault = "#d3cfc3",
            LinesInputs = "#8d948f",
            Divider = "#d3cfc3",
            DividerLight = "#e4e1d8",
            TableLines = "#dedacf",
            TableHover = "#0072b20d",
            TableStriped = "#00000005",
        },
        PaletteDark = new PaletteDark
        {
            Black = "#10161b",
            White = "#f2efe6",
            Background = "#1b2329",
            BackgroundGray = "#161d22",
            Surface = "#232d34",
            AppbarBackground = "#232d34",
            AppbarText = "#ece8dc",
            DrawerBackground = "#232d34",
            DrawerText = "#ece8dc",
            DrawerIcon = "#b6c0c5",
            TextPrimary = "#ece8dc",
            TextSecondary = "#b6c0c5",
            TextDisabled = "#7f8b92",
            ActionDefault = "#b6c0c5",
            ActionDisabled = "#6f7b82",
            ActionDisabledBackground = "#33404a",
            Primary = "#6cb9ea",
            PrimaryContrastText = "#10202c",
            PrimaryDarken = "#56b4e9",
            PrimaryLighten = "#8fcbf1",
            Secondary = "#b6c0c5",
            SecondaryContrastText = "#10202c",
            Info = "#6cb9ea",
            Success = "#4fc79f",
            Warning = "#e9b949",
            Error = "#ff9a62",
            SuccessContrastText = "#10202c",
            WarningContrastText = "#10202c",
            ErrorContrastText = "#10202c",
            InfoContrastText = "#10202c",
            LinesDefault = "#3c4952",
            LinesInputs = "#7d8a92",
            Divider = "#3c4952",
            DividerLight = "#303b43",
            TableLines = "#36424a",
            TableHover = "#6cb9ea14",
            TableStriped = "#ffffff08",
        },
        LayoutProperties = new LayoutProperties { DefaultBorderRadius = "3px", AppbarHeight = "44px" },
        Typography = new Typography
        {
            Default = new DefaultTypography { FontFamily = Family, FontSize = "0.9375rem", LineHeight = "1.4", LetterSpacing = "0" },
            Body1 = new Body1Typography { FontFamily = Family, FontSize = "0.9375rem", LineHeight = "1.4", LetterSpacing = "0" },
            Body2 = new Body2Typography { FontFamily = Family, FontSize = "0.875rem", LineHeight = "1.4", LetterSpacing = "0" },
            Caption = new CaptionTypography { FontFamily = Family, FontSize = "0.8125rem", LineHeight = "1.35", LetterSpacing = "0" },
            // Inputs take their type from this one.
            Subtitle1 = new Subtitle1Typography { FontFamily = Family, FontSize = "0.9375rem", FontWeight = "400", LetterSpacing = "0" },
            Subtitle2 = new Subtitle2Typography { FontFamily = Family, FontSize = "0.875rem", FontWeight = "600", LetterSpacing = "0" },
            H5 = new H5Typography { FontFamily = Family, FontSize = "1.375rem", FontWeight = "600", LetterSpacing = "0" },
            H6 = new H6Typography { FontFamily = Family, FontSize = "1.0625rem", FontWeight = "600", LetterSpacing = "0" },
            Button = new ButtonTypography { FontFamily = Family, FontSize = "0.875rem", FontWeight = "600", LetterSpacing = "0", TextTransform = "none" },
        },
    };
}

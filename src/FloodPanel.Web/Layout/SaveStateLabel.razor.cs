using System.Globalization;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Layout;

public sealed partial class SaveStateLabel
{
    [Inject]
    public required TimeProvider Time { get; init; }

    [Parameter, EditorRequired]
    public required SaveState State { get; set; }

    private string Words => State.Step switch
    {
        SaveStep.Saved => $"Saved {When}",
        SaveStep.Waiting or SaveStep.Saving => "Saving…",
        SaveStep.Conflict => "Not saved: changed elsewhere",
        SaveStep.Gone => "Not saved: deleted elsewhere",
        _ => $"Not saved: {State.Reason}",
    };

    private string When
    {
        get
        {
            var saved = TimeZoneInfo.ConvertTime(State.SavedAt, Time.LocalTimeZone);
            var today = Time.GetLocalNow().Date == saved.Date;
            return saved.ToString(today ? "HH:mm" : "d MMM yyyy", CultureInfo.InvariantCulture);
        }
    }
}

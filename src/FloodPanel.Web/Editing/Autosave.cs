using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage;

namespace FloodPanel.Web.Editing;

/// <summary>
/// Saves what is typed a moment after the typing pauses, one save at a time, and never over the revision of
/// someone else. The timer runs outside of the circuit: state is changed under the gate, read anywhere.
/// </summary>
public sealed class Autosave : IAsyncDisposable
{
    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(600);
    private static readonly TimeSpan LongestWait = TimeSpan.FromSeconds(3);
    private static readonly TimeSpan Retry = TimeSpan.FromSeconds(5);

    private readonly SemaphoreSlim gate = new(1, 1);
    private readonly ProjectAccess access;
    private readonly TimeProvider time;
    private readonly ITimer timer;
    private DateTimeOffset waitingSince;
    private Project latest = new();
    private Project saved = new();

    public Autosave(ProjectAccess access, TimeProvider time)
    {
        (this.access, this.time) = (access, time);
        State = new SaveState(SaveStep.Saved, time.GetUtcNow());
        timer = time.CreateTimer(_ => _ = SaveNowAsync(), null, Timeout.InfiniteTimeSpan, Timeout.InfiniteTimeSpan);
    }

    public Guid Id { get; private set; }

    public int Revision { get; private set; }

    public SaveState State { get; private set; }

    /// <summary>Raised on any thread.</summary>
    public event Action? Changed;

    /// <summary>Starts from what stands in the store.</summary>
    public void Start(StoredProject opened)
    {
        timer.Change(Timeout.InfiniteTimeSpan, Timeout.InfiniteTimeSpan);
        (Id, Revision, latest, saved) = (opened.Id, opened.Revision, opened.Project, opened.Project);
        Show(new SaveState(SaveStep.Saved, opened.SavedAt));
    }

    /// <summary>Takes note of an edit, and saves it soon.</summary>
    public void Note(Project project)
    {
        latest = project;
        if (State.NeedsChoice)
        {
            return;
        }

        var now = time.GetUtcNow();
        if (State.Step != SaveStep.Waiting)
        {
            waitingSince = now;
        }

        var left = waitingSince + LongestWait - now;
        timer.Change(left < Pause ? (left > TimeSpan.Zero ? left : TimeSpan.Zero) : Pause, Timeout.InfiniteTimeSpan);
        Show(State with { Step = SaveStep.Waiting, Reason = null });
    }

    /// <summary>Saves what has been typed so far; returns when it is stored, refused or has failed.</summary>
    public async Task SaveNowAsync()
    {
        await gate.WaitAsync();
        try
        {
            await SaveLatestAsync();
        }
        finally
        {
            gate.Release();
        }
    }

    /// <summary>After a choice was made: saving goes on.</summary>
    public Task ResumeAsync()
    {
        Show(State with { Step = SaveStep.Waiting, Reason = null });
        return SaveNowAsync();
    }

    private async Task SaveLatestAsync()
    {
        var snapshot = latest;
        if (State.NeedsChoice)
        {
            return;
        }

        timer.Change(Timeout.InfiniteTimeSpan, Timeout.InfiniteTimeSpan);
        if (snapshot == saved)
        {
            Show(State with { Step = SaveStep.Saved, Reason = null });
            return;
        }

        Show(State with { Step = SaveStep.Saving, Reason = null });
        try
        {
            Take(await access.Save(Id, Revision, snapshot), snapshot);
        }
        catch (Exception e)
        {
            // Whatever the store stumbled over, it is said on the screen until a later try succeeds.
            timer.Change(Retry, Timeout.InfiniteTimeSpan);
            Show(State with { Step = SaveStep.Failed, Reason = e.GetBaseException().Message });
        }
    }

    private void Take(SaveOutcome outcome, Project snapshot)
    {
        switch (outcome)
        {
            case ProjectSaved accepted:
                (Revision, saved) = (accepted.Revision, snapshot);
                // What was typed during the save has set the timer again.
                Show(new SaveState(ReferenceEquals(latest, snapshot) ? SaveStep.Saved : SaveStep.Waiting, accepted.SavedAt));
                break;
            case SaveConflict:
                Show(State with { Step = SaveStep.Conflict });
                break;
            case ProjectGone:
                Show(State with { Step = SaveStep.Gone });
                break;
            default:
                throw new InvalidOperationException($"The store answered {outcome}.");
        }
    }

    private void Show(SaveState state)
    {
        if (state != State)
        {
            State = state;
            Changed?.Invoke();
        }
    }

    public async ValueTask DisposeAsync()
    {
        await SaveNowAsync();
        await timer.DisposeAsync();
    }
}

namespace FloodPanel.Web.Layout;

internal static partial class Log
{
    [LoggerMessage(Level = LogLevel.Error, Message = "A page failed and was offered to be drawn again.")]
    public static partial void PageFailed(ILogger logger, Exception exception);
}

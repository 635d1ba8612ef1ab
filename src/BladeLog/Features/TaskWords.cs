using BladeLog.Records;

namespace BladeLog.Features;

/// <summary>What a person is trained at, in the shop's words.</summary>
internal static class TaskWords
{
    public static string Of(TrainedTask task) => task switch
    {
        TrainedTask.Operate => "operate",
        TrainedTask.ChangeBlade => "change the blade",
        TrainedTask.Sharpen => "sharpen",
        TrainedTask.Weld => "weld",
        TrainedTask.ClearHold => "clear a hold",
        _ => throw new ArgumentOutOfRangeException(nameof(task)),
    };
}

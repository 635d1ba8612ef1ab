namespace BladeLog.Records.Writing;

/// <summary>Which handler records which command.</summary>
internal static class Handlers
{
    public static Task Handle(WriteSession w, Command command) => command switch
    {
        SaveShop c => SaveShopHandler.Handle(w, c),
        SaveSetting c => SaveSettingHandler.Handle(w, c),
        AddPerson c => PersonHandler.Handle(w, c),
        EditPerson c => PersonHandler.Handle(w, c),
        AddSaw c => SawHandler.Handle(w, c),
        NewSetup c => SawHandler.Handle(w, c),
        EditSaw c => SawHandler.Handle(w, c),
        AddSpec c => SpecHandler.Handle(w, c),
        EditSpec c => SpecHandler.Handle(w, c),
        AddBlades c => BladeHandler.Handle(w, c),
        EditBlade c => BladeHandler.Handle(w, c),
        RetagBlade c => RetagBladeHandler.Handle(w, c),
        Swap c => SwapHandler.Handle(w, c),
        MoveSpell c => MoveSpellHandler.Handle(w, c),
        SlackTension c => SlackTensionHandler.Handle(w, c),
        ReadMeter c => ReadMeterHandler.Handle(w, c),
        RecordHours c => RecordHoursHandler.Handle(w, c),
        RecordCut c => RecordCutHandler.Handle(w, c),
        RecordSharpening c => RecordSharpeningHandler.Handle(w, c),
        SendBatch c => SendBatchHandler.Handle(w, c),
        TakeBack c => TakeBackHandler.Handle(w, c),
        RecordHold c => HoldHandler.Handle(w, c),
        ClearHold c => HoldHandler.Handle(w, c),
        RecordInspection c => RecordInspectionHandler.Handle(w, c),
        RecordBreak c => RecordBreakHandler.Handle(w, c),
        RecordRetirement c => RecordRetirementHandler.Handle(w, c),
        RecordJoint c => RecordJointHandler.Handle(w, c),
        CutDown c => CutDownHandler.Handle(w, c),
        RecordPriorUse c => RecordPriorUseHandler.Handle(w, c),
        RecordTension c => RecordTensionHandler.Handle(w, c),
        RecordDrift c => RecordTensionHandler.Handle(w, c),
        RecordStock c => RecordStockHandler.Handle(w, c),
        HangUp c => HangUpHandler.Handle(w, c),
        QueueCut c => CutListHandler.Handle(w, c),
        EditCut c => CutListHandler.Handle(w, c),
        DropCut c => CutListHandler.Handle(w, c),
        ReorderCuts c => CutListHandler.Handle(w, c),
        VoidEntry c => VoidEntryHandler.Handle(w, c),
        ImportRows c => ImportRowsHandler.Handle(w, c),
        _ => throw new ArgumentOutOfRangeException(nameof(command), $"Nothing records {command.GetType().Name}."),
    };
}

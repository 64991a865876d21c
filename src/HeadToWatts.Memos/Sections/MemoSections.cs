namespace HeadToWatts.Memos.Sections;

/// <summary>The sections of the memo, in the order in which they are read. A new one is written in a file of its own and named here.</summary>
internal static class MemoSections
{
    public static IReadOnlyList<Action<MemoContext>> All { get; } =
    [
        TitleSection.Write,
        AnswerSection.Write,
        ContentsSection.Write,
        SiteSection.Write,
        FlowDataSection.Write,
        RecordSection.Write,
        UsableWaterSection.Write,
        HeadSection.Write,
        CanalSection.Write,
        TurbineSection.Write,
        DesignFlowSection.Write,
        EnergySection.Write,
        PumpingSection.Write,
        MoneySection.Write,
        CautionsSection.Write,
        HazardsSection.Write,
        LimitsSection.Write,
        InputsAppendix.Write,
        WorkingsAppendix.Write,
        YearsAppendix.Write,
        ConstantsAppendix.Write,
        MethodsAppendix.Write,
        SourcesAppendix.Write,
    ];
}

namespace UnitVent.Charting.Entries;

/// <summary>How the release is set.</summary>
public enum SettingMethod
{
    /// <summary>End of release near half of the peak flow, at a fixed rate.</summary>
    FixedRate,

    /// <summary>T low from the flow trace, the rate follows.</summary>
    FlowGuided,

    /// <summary>Two pressures with a longer T low; end flow and rate are not judged.</summary>
    TwoLevel,
}

using BladeLog.Records;

namespace BladeLog.Advice.Cuts;

/// <summary>What a motor leaves for cutting, in W at the band: its share of load less its idling, through the drive.</summary>
public static class BandPower
{
    /// <summary>At a load the motor carries all day.</summary>
    public static double Easy(SawSetup setup, AdviceSettings settings) => At(CutSettings.LoadGreen, setup, settings);

    /// <summary>At the most it may be asked for a while.</summary>
    public static double Most(SawSetup setup, AdviceSettings settings) => At(CutSettings.LoadAmber, setup, settings);

    private static double At(SettingDefinition load, SawSetup setup, AdviceSettings settings)
    {
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(settings);
        double idle = setup.IdleW ?? settings[CutSettings.Idle] * setup.MotorW;
        return settings[CutSettings.Drive] * ((settings[load] * setup.MotorW) - idle);
    }
}

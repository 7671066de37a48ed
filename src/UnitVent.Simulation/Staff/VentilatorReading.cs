using UnitVent.Charting.Entries;
using UnitVent.Simulation.Ventilator;

namespace UnitVent.Simulation.Staff;

/// <summary>Reads the ventilator and the monitor as a careful therapist does.</summary>
internal static class VentilatorReading
{
    private const int ReleasesRead = 3;

    public static VentilatorCheck Of(BedsideMoment moment)
    {
        var (check, delivered) = (Common(moment, moment.State, moment.Read), moment.State.Delivered);
        return moment.Settings.Mode switch
        {
            VentilationMode.Aprv => WithRelease(check, delivered, moment.Read),
            VentilationMode.PressureSupport => WithSupport(check, delivered, moment.Read),
            _ => WithSetBreaths(check, delivered, moment.Bedside, moment.Read),
        };
    }

    private static VentilatorCheck Common(BedsideMoment moment, PatientState state, Instruments read) => new()
    {
        ObservedAt = moment.At,
        SettingsConfirmed = true,
        PeakPressureCmH2O = Typed.Number(read.Pressure("peak", state.Delivered.PeakPressureCmH2O)),
        MeanAirwayPressureCmH2O = Typed.Number(read.Pressure("mean", state.Delivered.MeanPressureCmH2O), 1),
        TotalMinuteVolumeLMin = Typed.Number(read.Volume("total minute volume", state.Delivered.TotalMinuteVolumeLMin), 1),
        TotalRatePerMin = Typed.Number(read.Rate("machine rate", state.Delivered.MachineRatePerMin) + read.Rate("own rate", state.Delivered.OwnRatePerMin)),
        EtCO2MmHg = Typed.Number(read.EtCO2(state.EtCO2MmHg)),
        SpO2Percent = Typed.Number(read.SpO2(state.SaO2Percent)),
        MeanArterialPressureMmHg = Typed.Number(read.Shifted("mean arterial pressure", moment.Patient.MeanArterialPressureMmHg, 2)),
        Vasopressor = moment.Bedside.Vasopressor,
        AlarmsChecked = true,
    };

    private static VentilatorCheck WithRelease(VentilatorCheck check, Delivered delivered, Instruments read) => Own(check, delivered, read) with
    {
        ReleaseRatePerMin = Typed.Number(delivered.MachineRatePerMin, 1),
        ReleaseVolumeMl = Typed.Number(read.Volume("release volume", delivered.MachineVolumeMl)),
        ReleasesAveraged = ReleasesRead,
        PeakExpiratoryFlowLMin = Typed.Number(read.Flow("peak flow", delivered.PeakExpiratoryFlowLMin!.Value)),
        EndReleaseFlowLMin = Typed.Number(read.Flow("end flow", delivered.EndReleaseFlowLMin!.Value)),
        FlowReadings = ReleasesRead,
        EffortDuringRelease = false,
    };

    private static VentilatorCheck WithSupport(VentilatorCheck check, Delivered delivered, Instruments read) => Own(check, delivered, read) with
    {
        TidalVolumeMl = Typed.Number(read.Volume("own volume", delivered.OwnVolumeMl)),
        SpontaneousMinuteVolumeLMin = check.TotalMinuteVolumeLMin,
    };

    private static VentilatorCheck WithSetBreaths(VentilatorCheck check, Delivered delivered, Bedside bedside, Instruments read)
    {
        var reading = check with { TidalVolumeMl = Typed.Number(read.Volume("tidal volume", delivered.MachineVolumeMl)) };
        return bedside.PlateauMeasured
            ? reading with
            {
                PlateauPressureCmH2O = Math.Min(reading.PeakPressureCmH2O!.Value, Typed.Number(read.Pressure("plateau", delivered.PlateauPressureCmH2O!.Value))),
                HoldS = 0.5m,
                Passive = true,
                AutoPeepCmH2O = Typed.Number(delivered.TrappedPressureCmH2O, 1),
            }
            : reading;
    }

    private static VentilatorCheck Own(VentilatorCheck check, Delivered delivered, Instruments read)
    {
        var rate = Typed.Number(read.Rate("own rate", delivered.OwnRatePerMin));
        return check with
        {
            SpontaneousRatePerMin = rate,
            SpontaneousTidalVolumeMl = rate == 0 ? null : Typed.Number(read.Volume("own volume", delivered.OwnVolumeMl)),
            SpontaneousMinuteVolumeLMin = rate == 0 ? 0 : Typed.Number(read.Volume("own minute volume", delivered.OwnMinuteVolumeLMin), 1),
        };
    }
}

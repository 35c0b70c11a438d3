using FloodPanel.Calculation.Handling;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Handling;

public class LogHandlingTests
{
    /// <summary>Bay 1.6 m, bearings 40 mm, clearance 10 mm: 1.67 m; 20 cm² of 2700 kg/m³: 9.018 kg.</summary>
    [Fact]
    public void Schedule_Log_LengthAndMassByHand()
    {
        var logs = new LogStack { Count = 6, EndBearing = 0.04, FittingClearance = 0.01 };
        var log = Stretch.Beam(70e9, 1e-6) with { Material = SampleProject.Aluminium };

        var row = LogHandling.Schedule(bay: 2, clearBay: 1.6, logs, new LogRun(1, 6, log));

        Assert.Equal((2, 6), (row.Bay, row.Count));
        Hand.Equal(1.67, row.CuttingLength);
        Hand.Equal(9.018, row.Mass);
    }

    /// <summary>51 lb is 23 kg; two people two thirds of the sum of two.</summary>
    [Fact]
    public void Limits_OneAndTwoPeople()
    {
        Assert.Equal(51, Units.FromSI(LogHandling.OnePerson, Dimension.Mass, UnitSystem.USCustomary), tolerance: 0.5);
        Hand.Equal(92.0 / 3, LogHandling.TwoPeople);
    }
}

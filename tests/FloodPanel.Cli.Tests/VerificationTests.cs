namespace FloodPanel.Cli.Tests;

/// <summary>data/verification.csv is what the command writes: figures that have moved must be looked at and written anew.</summary>
public class VerificationTests
{
    [Fact]
    public void Verification_Command_WritesTheDeliveredFile()
    {
        var written = Invocation.Of("verification");

        Assert.Equal(0, written.ExitCode);
        Assert.Equal(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "data", "verification.csv")), written.Output);
    }

    [Fact]
    public void Verification_Table_HasARowForEachFigure()
    {
        var lines = Invocation.Of("verification").Output.TrimEnd('\n').Split('\n');

        Assert.Equal("source,quantity,unit,published,computed,difference,evidence,remark", lines[0]);
        Assert.Equal(Calculation.Verification.VerificationTable.Rows().Count, lines.Length - 1);
    }
}

using System.Text;
using FloodPanel.Calculation.Verification;
using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Cli;

/// <summary>Finds the command, and keeps the promise that standard output holds results and nothing else.</summary>
internal static class CommandLine
{
    private const string Usage = """
        usage: floodpanel check FILE
               floodpanel verification

          check FILE     calculates every opening of a project file and writes one JSON object to standard output
          verification   writes what the calculation is held against, computed anew, as comma-separated values
          --help         shows this text

        exit code: 0 every opening is adequate, 1 one is inadequate or incomplete (or there is none), 2 the file
        cannot be calculated; one line on standard error then names the field and what is wrong with it

        The result is a calculation aid. It must be checked by a licensed engineer and follow local codes. A barrier can
        fail or be overtopped: people leave when told to.

        """;

    public static int Run(IReadOnlyList<string> arguments, Stream output, TextWriter errors)
    {
        try
        {
            return Dispatch(arguments, output, errors);
        }
        catch (RefusalException e)
        {
            errors.WriteLine(OneLine(e.Message));
        }
        catch (LibraryFileException e)
        {
            errors.WriteLine(OneLine(e.Problems[0]));
        }
        catch (IOException e)
        {
            errors.WriteLine(OneLine($"The result cannot be written: {e.Message}"));
        }

        return ExitCode.Refused;
    }

    private static int Dispatch(IReadOnlyList<string> arguments, Stream output, TextWriter errors)
    {
        switch (arguments)
        {
            case ["check", not "--help" and not "-h" and var file]:
                return CheckCommand.Run(file, output);
            case ["verification"]:
                output.Write(VerificationFile.Write(VerificationTable.Rows()));
                return ExitCode.Adequate;
            case ["--help" or "-h" or "help"] or ["check", "--help" or "-h"]:
                output.Write(Encoding.UTF8.GetBytes(Usage));
                return ExitCode.Adequate;
            default:
                errors.Write(Usage);
                return ExitCode.Refused;
        }
    }

    /// <summary>Names out of a file may hold line breaks; a script that reads the message must not see two.</summary>
    private static string OneLine(string message) => string.Concat(message.Select(c => char.IsControl(c) ? ' ' : c));
}

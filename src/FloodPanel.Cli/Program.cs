using System.Text;
using FloodPanel.Cli;

using var output = Console.OpenStandardOutput();
using var errors = new StreamWriter(Console.OpenStandardError(), new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
return CommandLine.Run(args, output, errors);

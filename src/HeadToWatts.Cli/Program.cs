return HeadToWatts.Cli.CommandLine.Run(args, Console.Out, Console.Error, Console.OpenStandardInput);

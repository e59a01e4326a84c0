// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.nio.file.Path;
import java.util.ServiceLoader;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import reedling.error.ExitCode;
import reedling.error.ReedlingException;

/** The {@code reedling} command. */
@Command(
        name = "reedling",
        description = "Simulates grains meeting machine parts that bend.",
        mixinStandardHelpOptions = true,
        versionProvider = ProgramVersion.class,
        subcommands = PluginsCommand.class)
public final class Main {

    private Main() {}

    /** Runs one command and ends the program with its exit code. */
    public static void main(String[] arguments) {
        StandardError.restore();
        Ending ending = new Ending();
        int code = commandLine(new FaultRecord(Path.of("")), ending).execute(arguments);
        ending.reached(code);
        // The one call of System.exit: a program can hand its exit code to the shell in no other way.
        System.exit(code);
    }

    /** All commands, for a program that no signal ends. */
    static CommandLine commandLine(FaultRecord faultRecord) {
        return commandLine(faultRecord, Ending.NONE);
    }

    private static CommandLine commandLine(FaultRecord faultRecord, Ending ending) {
        CommandLine commandLine = new CommandLine(new Main());
        commandLine.addSubcommand(new RunCommand(ending));
        commandLine.addSubcommand(new ResumeCommand(ending));
        commandLine.addSubcommand(new RepeatCommand(ending));
        commandLine.addSubcommand(new CheckCommand());
        commandLine.addSubcommand(new CertifyCommand());
        commandLine.addSubcommand(new NewLawCommand());
        ServiceLoader.load(SubCommand.class).forEach(commandLine::addSubcommand);
        commandLine.setCaseInsensitiveEnumValuesAllowed(true);
        setUsageExitCode(commandLine);
        commandLine.setExecutionExceptionHandler(
                (failure, failed, parsed) -> report(failure, failed, faultRecord, parsed.originalArgs()));
        return commandLine;
    }

    private static void setUsageExitCode(CommandLine commandLine) {
        commandLine.getCommandSpec().exitCodeOnInvalidInput(ExitCode.USAGE.number());
        commandLine.getSubcommands().values().forEach(Main::setUsageExitCode);
    }

    /** A finding is for the user, one a line; anything else is a fault of the program and is written down whole. */
    private static int report(
            Exception failure, CommandLine failed, FaultRecord faultRecord, Iterable<String> arguments) {
        if (failure instanceof ReedlingException expected) {
            expected.findings().forEach(finding -> failed.getErr().println(finding));
            return expected.exitCode().number();
        }
        failed.getErr().println(faultRecord.write(failure, arguments));
        return ExitCode.INTERNAL.number();
    }
}

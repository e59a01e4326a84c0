// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.PrintWriter;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import reedling.casefile.CaseAssembly;
import reedling.casefile.CaseForecast;
import reedling.casefile.CasePlugins;
import reedling.casefile.CaseReading;
import reedling.error.ExitCode;
import reedling.plugin.PluginCatalogue;

/** Checks a case without running it. */
@Command(
        name = "check",
        description = "Checks a case and prints what follows from its numbers.",
        mixinStandardHelpOptions = true)
final class CheckCommand implements Callable<Integer> {

    @Mixin
    private final CaseOptions caseOptions = new CaseOptions();

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private CommandSpec spec;

    @Override
    public Integer call() {
        PluginCatalogue plugins = caseOptions.plugins();
        CaseReading reading = caseOptions.read(plugins);
        CasePlugins available = new CasePlugins(plugins);
        CaseAssembly assembly = CaseAssembly.make(reading, available);
        PrintWriter out = spec.commandLine().getOut();
        out.print(CaseForecast.of(assembly, available, Runtime.getRuntime().availableProcessors()));
        out.flush();
        return ExitCode.OK.number();
    }
}

// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import reedling.conform.Certificate;
import reedling.conform.CertificatePage;
import reedling.conform.LoadedLaws;
import reedling.conform.Subject;
import reedling.contact.ContactLawProvider;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.field.FieldProvider;
import reedling.file.WholeFile;
import reedling.output.JsonText;
import reedling.plugin.PluginCatalogue;
import reedling.plugin.PluginDescription;
import reedling.structure.ElementType;
import reedling.unit.Spelling;

/** Tries a plugin against the contract of its interface and writes what was found. */
@Command(
        name = "certify",
        description =
                "Tries a contact law against the contract of its interface: balance of forces and torques, frames,"
                        + " energy, bits, checkpoints, time scale, finite numbers, allocation; draws what it does and measures"
                        + " what it costs. Fields and elements are tried more briefly. Ends with 0 if nothing was found, with 79"
                        + " if a check found something.",
        mixinStandardHelpOptions = true)
final class CertifyCommand implements Callable<Integer> {

    private static final List<String> KINDS = List.of("contact", "field", "element");

    @Parameters(paramLabel = "NAME", description = "Name of the contact law, field or element, as in cases.")
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private String name;

    @Option(
            names = "--out",
            paramLabel = "FOLDER",
            description = "Folder for certificate.txt, .json and .html; made if missing (default: none are written).")
    private @Nullable Path out;

    @Option(
            names = "--set",
            paramLabel = "PARAMETER=VALUE",
            description = "Sets a parameter of the plugin, e.g. --set stiffness=\"2e5 N/m\". Repeatable.")
    private Map<String, String> given = new LinkedHashMap<>();

    @Option(
            names = "--kind",
            paramLabel = "KIND",
            description = "contact, field or element, where two plugins share a name (default: the first of these).")
    private @Nullable String kind;

    @Mixin
    private final PluginFolder pluginFolder = new PluginFolder();

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private CommandSpec spec;

    @Override
    public Integer call() {
        PluginCatalogue plugins = pluginFolder.load();
        Certificate certificate = certificate(plugins);
        PrintWriter screen = spec.commandLine().getOut();
        screen.print(certificate.text());
        if (out != null) {
            write(certificate, out);
            screen.println("Written: " + out.resolve("certificate.html") + ", .txt, .json");
        }
        screen.flush();
        return (certificate.passed() ? ExitCode.OK : ExitCode.FOUND).number();
    }

    private Certificate certificate(PluginCatalogue plugins) {
        List<PluginDescription> known = plugins.descriptions().stream()
                .filter(plugin -> KINDS.contains(plugin.kind()))
                .filter(plugin -> kind == null || plugin.kind().equals(kind))
                .toList();
        PluginDescription plugin = known.stream()
                .filter(one -> one.name().equals(name))
                .findFirst()
                .orElseThrow(() -> unknown(known));
        return switch (plugin.kind()) {
            case "field" -> {
                FieldProvider provider = plugins.require(PluginServices.FIELD, name, "certify");
                yield Certificate.of(provider, GivenParameters.read(provider, given), plugin);
            }
            case "element" -> {
                ElementType type = plugins.require(PluginServices.ELEMENT, name, "certify");
                yield Certificate.of(type, GivenParameters.read(type, given), plugin);
            }
            default -> {
                ContactLawProvider provider = plugins.require(PluginServices.CONTACT, name, "certify");
                Map<String, Double> values = GivenParameters.read(provider, given);
                yield Certificate.of(Subject.of(provider, values, LoadedLaws.of(plugins)), plugin);
            }
        };
    }

    private ReedlingException unknown(List<PluginDescription> plugins) {
        List<String> known = plugins.stream()
                .map(PluginDescription::name)
                .distinct()
                .sorted()
                .toList();
        String remedy = Spelling.nearest(name, known)
                .map(nearest -> "Did you mean " + nearest + "?")
                .orElse("Choose one of these, or name the folder of its jar with --plugins.");
        return new ReedlingException(
                ExitCode.PLUGIN,
                new Finding("command line", "NAME", '"' + name + '"', String.join(", ", known), remedy));
    }

    private static void write(Certificate certificate, Path folder) {
        try {
            Files.createDirectories(folder);
            WholeFile.writeText(folder.resolve("certificate.txt"), certificate.text());
            WholeFile.writeText(folder.resolve("certificate.json"), JsonText.of(certificate.json()));
            WholeFile.writeText(folder.resolve("certificate.html"), CertificatePage.of(certificate));
        } catch (IOException failure) {
            throw RunSession.unusable(folder, failure);
        }
    }
}

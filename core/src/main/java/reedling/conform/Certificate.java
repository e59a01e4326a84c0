// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import reedling.contact.Stage;
import reedling.field.Field;
import reedling.field.FieldProvider;
import reedling.math.Lanes;
import reedling.plugin.ParameterValues;
import reedling.plugin.PluginDescription;
import reedling.plugin.Provider;
import reedling.structure.ElementType;

/**
 * What a trial of one plugin found and measured.
 *
 * @param plugin on trial
 * @param setting lines that say how it was tried
 * @param results of all checks
 * @param speed what it costs; empty where no cost was measured
 * @param charts what it does
 */
public record Certificate(
        PluginDescription plugin,
        List<String> setting,
        List<LawTrial.Result> results,
        Optional<Speed> speed,
        List<Chart> charts) {

    public Certificate {
        setting = List.copyOf(setting);
        results = List.copyOf(results);
        charts = List.copyOf(charts);
    }

    /** Runs all checks and measurements of a contact law; some ten seconds. */
    public static Certificate of(Subject subject, PluginDescription plugin) {
        Optional<OtherWidth> other = OtherWidth.of(subject);
        List<LawTrial.Result> results = LawTrial.run(subject, other);
        boolean gives =
                results.stream().noneMatch(result -> result.outcome().measured().startsWith("Not measured"));
        return new Certificate(
                plugin,
                setting(subject),
                results,
                gives ? Optional.of(Speed.of(subject, other)) : Optional.empty(),
                gives ? charts(subject) : List.of());
    }

    /** Runs all checks of a field. */
    public static Certificate of(FieldProvider provider, Map<String, Double> given, PluginDescription plugin) {
        Field field = provider.create(ParameterValues.of(provider, given));
        List<String> lines = new ArrayList<>(values(provider, ParameterValues.of(provider, given)));
        lines.add("Tried on 96 grains of 2 to 20 mm, 1250 kg/m3, in a cube of 1 m.");
        return new Certificate(plugin, lines, FieldTrial.run(field), Optional.empty(), List.of());
    }

    /** Runs all checks of an element. */
    public static Certificate of(ElementType type, Map<String, Double> given, PluginDescription plugin) {
        List<String> lines = new ArrayList<>(values(type, ParameterValues.of(type, given)));
        lines.add("Tried on a free steel rod of 4 mm and 200 mm length, in four elements.");
        return new Certificate(plugin, lines, ElementTrial.run(type, given), Optional.empty(), List.of());
    }

    private static List<String> values(Provider provider, ParameterValues values) {
        return provider.parameters().stream()
                .map(parameter -> parameter.name() + " = " + values.get(parameter.name()) + " "
                        + parameter.dimension().siUnit())
                .toList();
    }

    private static List<String> setting(Subject subject) {
        List<String> lines = new ArrayList<>();
        lines.add("Stage " + subject.stage().name().toLowerCase(Locale.ROOT).replace('_', ' ')
                + "; stages in the trial: "
                + String.join(
                        ", ",
                        subject.laws().keySet().stream()
                                .sorted()
                                .map(stage ->
                                        stage.name().toLowerCase(Locale.ROOT).replace('_', ' '))
                                .toList())
                + ".");
        lines.addAll(values(subject.provider(), new ParameterValues(subject.values())));
        lines.add(
                "Tried on plastic pellets of 10 mm (1250 kg/m3, 100 MPa, Poisson ratio 0.3) and, for finite numbers, on"
                        + " bodies from jelly to diamond.");
        lines.add("Java " + Runtime.version() + " on " + System.getProperty("os.arch") + ", kernels run "
                + (Lanes.VECTORISED ? "eight rows" : "one row") + " at a time.");
        return lines;
    }

    private static List<Chart> charts(Subject subject) {
        List<Chart> charts = new ArrayList<>();
        charts.add(Loops.impact(subject.laws()));
        charts.addAll(Loops.turning(subject.laws()));
        charts.add(Impacts.restitution(subject.laws()));
        if (subject.laws().containsKey(Stage.TANGENTIAL)) {
            charts.add(Impacts.oblique(subject.laws()));
        }
        return charts;
    }

    /** True when no check found anything. */
    public boolean passed() {
        return results.stream().allMatch(LawTrial.Result::passed);
    }

    /** Number of checks that found something. */
    public long failed() {
        return results.stream().filter(result -> !result.passed()).count();
    }

    /** One line: the outcome. */
    public String verdict() {
        return passed()
                ? "Passed: all " + results.size() + " checks."
                : "Failed: " + failed() + " of " + results.size() + " checks found something.";
    }

    /** As plain text. */
    public String text() {
        StringBuilder text = new StringBuilder();
        text.append("Certificate of the ")
                .append(plugin.kind())
                .append(" plugin ")
                .append(plugin.name())
                .append(" (")
                .append(plugin.version())
                .append(")\n");
        text.append(plugin.summary()).append('\n');
        text.append("Source: ").append(plugin.source()).append('\n');
        text.append("Jar: ").append(plugin.jar()).append('\n');
        setting.forEach(line -> text.append(line).append('\n'));
        text.append('\n');
        for (LawTrial.Result result : results) {
            text.append(result.passed() ? "  pass  " : "  FAIL  ")
                    .append(result.check())
                    .append('\n');
            text.append("        ").append(result.outcome().measured()).append('\n');
            result.outcome()
                    .findings()
                    .forEach(finding ->
                            text.append("        -> ").append(finding).append('\n'));
        }
        speed.ifPresent(cost -> text.append("\nCost: ").append(cost.text()).append('\n'));
        return text.append('\n').append(verdict()).append('\n').toString();
    }

    /** As maps and lists for JSON. */
    public Map<String, Object> json() {
        Map<String, Object> json = new LinkedHashMap<>();
        json.put("name", plugin.name());
        json.put("kind", plugin.kind());
        json.put("version", plugin.version());
        json.put("jar", plugin.jar());
        json.put("passed", passed());
        json.put("setting", setting);
        List<Object> checks = new ArrayList<>();
        for (LawTrial.Result result : results) {
            Map<String, Object> one = new LinkedHashMap<>();
            one.put("check", result.check());
            one.put("passed", result.passed());
            one.put("measured", result.outcome().measured());
            one.put("findings", result.outcome().findings());
            checks.add(one);
        }
        json.put("checks", checks);
        speed.ifPresent(cost -> {
            json.put("nanoseconds_per_contact", cost.here());
            json.put("nanoseconds_per_contact_other_width", cost.otherWidth().orElse(Double.NaN));
            json.put("built_in", cost.yardstickName());
            json.put("nanoseconds_per_contact_built_in", cost.yardstick().orElse(Double.NaN));
        });
        json.put("charts", charts.stream().map(Certificate::chart).toList());
        return json;
    }

    private static Map<String, Object> chart(Chart chart) {
        Map<String, Object> json = new LinkedHashMap<>();
        json.put("title", chart.title());
        json.put("x", chart.xLabel());
        json.put("y", chart.yLabel());
        List<Object> series = new ArrayList<>();
        for (Series line : chart.series()) {
            Map<String, Object> one = new LinkedHashMap<>();
            one.put("name", line.name());
            one.put("x", java.util.Arrays.stream(line.x()).boxed().toList());
            one.put("y", java.util.Arrays.stream(line.y()).boxed().toList());
            series.add(one);
        }
        json.put("series", series);
        return json;
    }
}

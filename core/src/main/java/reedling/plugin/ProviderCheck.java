// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import reedling.error.Finding;

/** Checks what a provider says of itself before anything relies on it. */
final class ProviderCheck {

    private static final Pattern KEBAB_CASE = Pattern.compile("[a-z][a-z0-9]*(-[a-z0-9]+)*");
    private static final Pattern SNAKE_CASE = Pattern.compile("[a-z][a-z0-9]*(_[a-z0-9]+)*");

    private final String jar;
    private final Consumer<Finding> findings;

    ProviderCheck(String jar, Consumer<Finding> findings) {
        this.jar = jar;
        this.findings = findings;
    }

    /** True if the provider may be used; each reason why not is handed to the findings. */
    boolean accepts(Provider provider) {
        String type = provider.getClass().getName();
        // First and alone: a jar of another level may lack the methods asked for next.
        if (provider.apiLevel() != Provider.API_LEVEL) {
            findings.accept(new Finding(
                    jar,
                    "API level of " + type,
                    String.valueOf(provider.apiLevel()),
                    String.valueOf(Provider.API_LEVEL),
                    "Take a version of this plugin that was built for this version of Reedling."));
            return false;
        }
        boolean named = hasKebabCaseName(provider);
        boolean described = describesItself(provider);
        boolean declared = declaresSoundParameters(provider);
        return named && described && declared;
    }

    private boolean hasKebabCaseName(Provider provider) {
        String name = provider.name();
        return require(
                name != null && KEBAB_CASE.matcher(name).matches(),
                "name of " + provider.getClass().getName(),
                quoted(name),
                "a kebab-case word such as soft-shell");
    }

    private boolean describesItself(Provider provider) {
        String summary = provider.summary();
        String source = provider.source();
        boolean summarised = require(
                summary != null && !summary.isBlank(),
                "summary of " + provider.name(),
                quoted(summary),
                "one sentence");
        boolean sourced = require(
                source != null && !source.isBlank(),
                "source of " + provider.name(),
                quoted(source),
                "author, title, year of its formula");
        return summarised && sourced;
    }

    private boolean declaresSoundParameters(Provider provider) {
        List<Parameter> parameters = provider.parameters();
        if (!require(parameters != null, "parameters of " + provider.name(), "null", "a list, empty if none")) {
            return false;
        }
        Set<String> seen = new HashSet<>();
        boolean sound = true;
        for (Parameter parameter : parameters) {
            String what = "parameter of " + provider.name();
            sound &= require(
                    SNAKE_CASE.matcher(parameter.name()).matches() && seen.add(parameter.name()),
                    what,
                    quoted(parameter.name()),
                    "a snake_case word used once");
            double value = parameter.defaultValue();
            sound &= require(
                    parameter.obligatory() || (parameter.minimum() <= value && value <= parameter.maximum()),
                    "default of " + what + " " + parameter.name(),
                    value + " " + parameter.dimension().siUnit(),
                    parameter.minimum() + " .. " + parameter.maximum() + " in SI");
            Parameter.Wording wording = parameter.wording();
            sound &= require(
                    wording.kind() != Parameter.Kind.CHOICE || wording.choices().contains(wording.fallback()),
                    "default of " + what + " " + parameter.name(),
                    quoted(wording.fallback()),
                    "one of " + String.join(", ", wording.choices()));
        }
        return sound;
    }

    private boolean require(boolean condition, String what, String got, String expected) {
        if (!condition) {
            findings.accept(new Finding(jar, what, got, expected, "Repair the plugin, or take the jar away."));
        }
        return condition;
    }

    private static String quoted(@Nullable String text) {
        return text == null ? "null" : '"' + text + '"';
    }
}

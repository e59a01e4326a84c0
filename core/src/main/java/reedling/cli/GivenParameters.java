// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.plugin.Parameter;
import reedling.plugin.Provider;
import reedling.unit.Quantity;
import reedling.unit.QuantityException;

/** Parameters of a plugin as given on the command line. */
final class GivenParameters {

    private static final String WHERE = "command line";

    private GivenParameters() {}

    /**
     * Values in SI of the parameters that were given.
     *
     * @throws ReedlingException with every parameter that is unknown, missing, unreadable or out of its range
     */
    static Map<String, Double> read(Provider provider, Map<String, String> given) {
        List<Finding> findings = new ArrayList<>();
        Map<String, Double> values = new LinkedHashMap<>();
        List<String> known = provider.parameters().stream().map(Parameter::name).toList();
        given.keySet().stream()
                .filter(name -> !known.contains(name))
                .forEach(name -> findings.add(new Finding(
                        WHERE,
                        "--set " + name,
                        "no parameter of " + provider.name(),
                        known.isEmpty() ? "no parameter" : String.join(", ", known),
                        "")));
        for (Parameter parameter : provider.parameters()) {
            String text = given.get(parameter.name());
            if (text != null) {
                read(parameter, text, values, findings);
            } else if (parameter.obligatory()) {
                findings.add(new Finding(
                        WHERE, "--set " + parameter.name(), "missing", range(parameter), parameter.meaning()));
            }
        }
        if (!findings.isEmpty()) {
            throw new ReedlingException(ExitCode.USAGE, findings);
        }
        return values;
    }

    private static void read(Parameter parameter, String text, Map<String, Double> values, List<Finding> findings) {
        try {
            double value = Quantity.read(text, parameter.dimension());
            if (value >= parameter.minimum() && value <= parameter.maximum()) {
                values.put(parameter.name(), value);
            } else {
                findings.add(new Finding(
                        WHERE, "--set " + parameter.name(), '"' + text + '"', range(parameter), parameter.meaning()));
            }
        } catch (QuantityException fault) {
            findings.add(fault.at(WHERE, "--set " + parameter.name()));
        }
    }

    private static String range(Parameter parameter) {
        return parameter.minimum() + " .. " + parameter.maximum() + " "
                + parameter.dimension().siUnit();
    }
}

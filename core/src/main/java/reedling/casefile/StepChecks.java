// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;

/** What the integrator of a case can do against what the case holds. */
final class StepChecks {

    private static final List<String> MIDPOINT_KEYS = List.of("theta", "tolerance");

    private StepChecks() {}

    static void run(Draft draft, Rules rules) {
        draft.part("steps").ifPresent(values -> {
            if (values.text("integrator").equals(ControlKeys.MIDPOINT)) {
                midpoint(draft, rules);
            } else {
                MIDPOINT_KEYS.stream().filter(values::has).forEach(key -> unused(key, rules));
            }
        });
    }

    private static void midpoint(Draft draft, Rules rules) {
        draft.wires.keySet().stream()
                .findFirst()
                .ifPresent(wire -> rules.error(
                        "steps.integrator",
                        '"' + ControlKeys.MIDPOINT + "\" in a case with wires." + wire,
                        '"' + ControlKeys.EXPLICIT + '"',
                        "The midpoint rule iterates over grains and walls only; wires take explicit fine steps of their"
                                + " own. Leave the wires out of a reference run."));
        rules.caution(
                "steps.integrator",
                '"' + ControlKeys.MIDPOINT + '"',
                '"' + ControlKeys.EXPLICIT + "\" but for reference runs",
                "It takes the same steps with several force passes each: expect five to fifteen times the time.");
    }

    private static void unused(String key, Rules rules) {
        rules.error(
                "steps." + key,
                "given for the explicit integrator",
                "integrator = \"" + ControlKeys.MIDPOINT + "\" beside it",
                "Remove it, or choose the midpoint rule.");
    }
}

// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;
import reedling.contact.Stage;

/**
 * Stages of the contact law.
 *
 * @param byStage the law of each stage that the case has, in the order of the stages; there is always a normal one
 */
public record LawsSpecification(Map<Stage, PluginChoice> byStage) {

    public LawsSpecification {
        byStage = Collections.unmodifiableMap(new EnumMap<>(byStage));
    }

    public PluginChoice normal() {
        return Objects.requireNonNull(byStage.get(Stage.NORMAL));
    }
}

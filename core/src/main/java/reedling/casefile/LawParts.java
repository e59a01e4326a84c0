// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import reedling.contact.ContactLaw;
import reedling.contact.LawSet;
import reedling.contact.NamedLaw;
import reedling.contact.Stage;
import reedling.field.Field;
import reedling.material.MaterialTable;
import reedling.structure.Position;

/**
 * Laws and fields of a case.
 *
 * @param byStage contact laws
 * @param fields in the order of the file
 * @param plugins every plugin the case uses with the version of the history it keeps; 0 for one that keeps none
 */
record LawParts(Map<Stage, ContactLaw> byStage, List<Field> fields, Map<String, Integer> plugins) {

    static LawParts make(CaseReading reading, CasePlugins plugins, PartFaults faults) {
        LawParts parts = new LawParts(new EnumMap<>(Stage.class), new ArrayList<>(), new TreeMap<>());
        CaseSpecification specification = reading.specification();
        parts.law(Stage.NORMAL, "laws.normal", specification.laws().normal(), reading, plugins, faults);
        parts.law(Stage.TANGENTIAL, "laws.tangential", specification.laws().tangential(), reading, plugins, faults);
        parts.law(Stage.ROLLING, "laws.rolling", specification.laws().rolling(), reading, plugins, faults);
        specification.fields().forEach((name, choice) -> {
            String path = "fields." + name;
            faults.make(
                            path,
                            () -> plugins.field(choice.name(), reading.where(path))
                                    .create(choice.parameters()))
                    .ifPresent(parts.fields::add);
            parts.plugins.put(choice.name(), 0);
        });
        specification
                .wires()
                .values()
                .forEach(wire -> parts.plugins.put(wire.element().name(), 0));
        return parts;
    }

    private void law(
            Stage stage,
            String path,
            PluginChoice choice,
            CaseReading reading,
            CasePlugins available,
            PartFaults faults) {
        faults.make(
                        path,
                        () -> available.law(choice.name(), reading.where(path)).create(choice.parameters()))
                .ifPresent(law -> {
                    byStage.put(stage, new NamedLaw(choice.name(), law));
                    plugins.put(choice.name(), law.historyVersion());
                });
    }

    LawSet bind(MaterialTable table) {
        return new LawSet(byStage, table);
    }

    /** What structures feel of the fields, m/s2. */
    Position gravity() {
        double[] sum = new double[3];
        for (Field field : fields) {
            double[] one = field.uniformAcceleration();
            for (int k = 0; k < 3; k++) {
                sum[k] += one[k];
            }
        }
        return new Position(sum[0], sum[1], sum[2]);
    }
}

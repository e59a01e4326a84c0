// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.LawCombination;
import reedling.contact.LawSet;
import reedling.contact.NamedLaw;
import reedling.contact.Stage;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
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
        specification.laws().byStage().forEach((stage, choice) -> parts.law(stage, choice, reading, plugins, faults));
        refuse(specification.laws(), reading, plugins, faults);
        specification.fields().forEach((name, choice) -> {
            String path = "fields." + name;
            faults.make(
                            path,
                            () -> fieldThatSuits(
                                    plugins.field(choice.name(), reading.where(path))
                                            .create(choice.parameters()),
                                    choice.name(),
                                    path,
                                    reading))
                    .ifPresent(parts.fields::add);
            parts.plugins.put(choice.name(), 0);
        });
        specification
                .wires()
                .values()
                .forEach(wire -> parts.plugins.put(wire.element().name(), 0));
        return parts;
    }

    /** Refuses a field that the integrator of the case cannot take. */
    private static Field fieldThatSuits(Field field, String law, String path, CaseReading reading) {
        boolean explicit = reading.specification().steps().midpoint().isEmpty();
        if (explicit || field.motionForce().isEmpty()) {
            return field;
        }
        throw new ReedlingException(
                ExitCode.CASE,
                List.of(new Finding(
                        reading.where(path),
                        "law",
                        law + ", a force that depends on velocity",
                        "a field with a potential, such as gravity",
                        "The midpoint rule iterates over contacts and positions only. Leave the field out of a reference"
                                + " run, or take explicit steps.")));
    }

    /** Faults of laws that do not stand together. */
    private static void refuse(LawsSpecification laws, CaseReading reading, CasePlugins plugins, PartFaults faults) {
        Map<Stage, ContactLawProvider> providers = new EnumMap<>(Stage.class);
        laws.byStage()
                .forEach((stage, choice) ->
                        providers.put(stage, plugins.law(choice.name(), reading.where(LawKeys.path(stage)))));
        LawCombination.refusals(providers)
                .forEach(refusal ->
                        faults.add(LawKeys.path(refusal.stage()), refusal.got(), refusal.expected(), refusal.remedy()));
    }

    private void law(Stage stage, PluginChoice choice, CaseReading reading, CasePlugins available, PartFaults faults) {
        String path = LawKeys.path(stage);
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

// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import reedling.contact.Stage;

/** Keys of the contact law: one for each stage, named like it. */
final class LawKeys {

    static final Section LAWS = Section.of(
            "Stages of the contact law. Normal force, adhesion and near field add up.",
            Key.preset("normal", law(ProviderKind.NORMAL), "hertz", "Normal force."),
            Key.optional("adhesion", law(ProviderKind.ADHESION), "Attraction of bodies that touch."),
            Key.optional("near_field", law(ProviderKind.NEAR_FIELD), "Forces across a gap."),
            Key.preset("tangential", law(ProviderKind.TANGENTIAL), "mindlin", "Friction."),
            Key.preset("rolling", law(ProviderKind.ROLLING), "elastic-plastic", "Rolling resistance."),
            Key.optional("twisting", law(ProviderKind.TWISTING), "Resistance to spin about the normal."));

    private LawKeys() {}

    private static ValueType law(ProviderKind kind) {
        return new ValueType.Plugin(kind, "law");
    }

    static String path(Stage stage) {
        return "laws." + key(stage);
    }

    private static String key(Stage stage) {
        return stage.name().toLowerCase(Locale.ROOT);
    }

    static LawsSpecification read(Values values) {
        Map<Stage, PluginChoice> byStage = new EnumMap<>(Stage.class);
        for (Stage stage : Stage.values()) {
            if (values.has(key(stage))) {
                byStage.put(stage, values.plugin(key(stage)));
            }
        }
        return new LawsSpecification(byStage);
    }
}

// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/** The whole of a case file: the one table from which validation, JSON Schema and key reference are made. */
final class CaseKeys {

    static final Section ROOT = Section.of(
            "A case: grains, machine parts, laws and output.",
            Key.required("case", new ValueType.Part(ControlKeys.CASE), "What the case is."),
            Key.required(
                    "materials", new ValueType.Named(new ValueType.Part(MaterialKeys.MATERIAL), "NAME"), "Materials."),
            Key.required(
                    "pairs",
                    new ValueType.Several(MaterialKeys.PAIR),
                    "What every two materials that can touch do to each other."),
            Key.required("lots", new ValueType.Named(new ValueType.Part(LotKeys.SECTION), "NAME"), "Lots of grain."),
            Key.required("feeds", new ValueType.Named(FeedKeys.TYPE, "NAME"), "Where grains come from."),
            Key.optional("walls", new ValueType.Named(WallKeys.TYPE, "NAME"), "Rigid walls."),
            Key.optional(
                    "motions", new ValueType.Named(MotionKeys.TYPE, "NAME"), "Prescribed motions of walls and wires."),
            Key.optional(
                    "wires",
                    new ValueType.Named(new ValueType.Part(WireKeys.SECTION), "NAME"),
                    "Rows of parts that bend."),
            Key.optional(
                    "outlets",
                    new ValueType.Named(new ValueType.Part(ControlKeys.BOX), "NAME"),
                    "Boxes that count grains by lot and remove them, when their centre is inside."),
            Key.required(
                    "bounds", new ValueType.Part(ControlKeys.BOX), "Grains whose centre leaves this box are spilled."),
            Key.optional("screen", new ValueType.Part(ControlKeys.SCREEN), "Report of a screen deck."),
            Key.optional(
                    "probes", new ValueType.Named(ProbeKeys.TYPE, "NAME"), "Figures taken from all grains together."),
            Key.optional("laws", new ValueType.Part(LawKeys.LAWS), "Stages of the contact law."),
            Key.optional(
                    "fields",
                    new ValueType.Named(new ValueType.Plugin(ProviderKind.FIELD, "law"), "NAME"),
                    "Forces on single grains, such as gravity."),
            Key.optional("steps", new ValueType.Part(ControlKeys.STEPS), "Limits of the time step."),
            Key.required("output", new ValueType.Part(ControlKeys.OUTPUT), "What is written and when."));

    private CaseKeys() {}
}

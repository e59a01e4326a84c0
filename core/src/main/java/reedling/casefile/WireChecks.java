// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Proportions of wires, and softening of grains against their stiffness. */
final class WireChecks {

    /** Strain above which a taut wire deserves a second look. */
    private static final double LARGE_STRAIN = 0.1;

    /** Contact stiffness over lateral stiffness of a wire below which softened grains, not wires, decide what passes. */
    private static final double SOFT = 20;

    /** Overlap over radius at which the two stiffnesses are compared. */
    private static final double OVERLAP = 0.01;

    private final Draft draft;
    private final Rules rules;

    private WireChecks(Draft draft, Rules rules) {
        this.draft = draft;
        this.rules = rules;
    }

    static void run(Draft draft, Rules rules) {
        WireChecks checks = new WireChecks(draft, rules);
        for (WireSpecification wire : draft.wires.values()) {
            checks.proportions(wire);
            Material material = draft.materials.get(wire.material());
            if (material != null && !wire.rigid()) {
                checks.strain(wire, material);
                draft.lots.values().forEach(lot -> checks.softening(wire, material, lot));
            }
        }
        checks.unusedMotions();
    }

    private void proportions(WireSpecification wire) {
        double diameter = wire.section().outerDiameter();
        String path = "wires." + wire.name();
        if (wire.length() < diameter) {
            rules.error(
                    path + ".end",
                    length(wire.length()) + " from start",
                    "at least the diameter, " + length(diameter),
                    "A part shorter than thick is no wire: model it as a wall.");
        } else if (diameter >= wire.elementLength() && !wire.rigid()) {
            rules.caution(
                    path + ".elements",
                    wire.elements() + ", each " + length(wire.elementLength()) + " long",
                    "elements longer than the diameter, " + length(diameter),
                    "Short elements cost small steps and bend no better: use fewer.");
        }
        if (wire.count() > 1 && wire.spacing() < diameter) {
            rules.error(
                    path + ".pitch",
                    length(wire.spacing()) + " across the wires",
                    "at least the diameter, " + length(diameter),
                    "Neighbouring wires would overlap: widen the pitch.");
        }
    }

    private void strain(WireSpecification wire, Material material) {
        double strain = wire.tension() / (material.youngsModulus() * area(wire.section()));
        if (strain > LARGE_STRAIN) {
            rules.caution(
                    "wires." + wire.name() + ".tension",
                    QuantityText.of(wire.tension(), Dimension.FORCE) + ", a strain of "
                            + QuantityText.of(100 * strain, Dimension.NUMBER) + " %",
                    "a strain below 10 %",
                    "Check tension, diameter and Young's modulus.");
        }
    }

    private static double inner(WireSection section) {
        return section instanceof WireSection.Tube tube ? tube.innerDiameter() : 0;
    }

    private static double area(WireSection section) {
        double outer = section.outerDiameter();
        double inner = inner(section);
        return Math.PI / 4 * (outer * outer - inner * inner);
    }

    /**
     * Warns when a grain is not much stiffer than the wire it pushes aside.
     *
     * <p>Formula: contact 2 E* sqrt(R d) at d = 0.01 R (Hertz; Johnson, Contact Mechanics, 1985), wire 4 T/L + 192 EI/L^3
     * (mid-span, clamped; textbook).
     */
    private void softening(WireSpecification wire, Material material, LotSpecification lot) {
        double length = wire.length();
        double inertia =
                Math.PI / 64 * (Math.pow(wire.section().outerDiameter(), 4) - Math.pow(inner(wire.section()), 4));
        double lateral =
                4 * wire.tension() / length + 192 * material.youngsModulus() * inertia / (length * length * length);
        for (MaterialPair pair : draft.pairs) {
            boolean both = (pair.first().name().equals(lot.material())
                            && pair.second().name().equals(material.name()))
                    || (pair.second().name().equals(lot.material())
                            && pair.first().name().equals(material.name()));
            double radius = 0.5 * lot.diameter().typical();
            double contact = 2 * pair.contactModulus() * radius * Math.sqrt(OVERLAP);
            if (both && contact < SOFT * lateral) {
                rules.caution(
                        "materials." + lot.material() + ".youngs_modulus",
                        "soft: grains of lot " + lot.name() + " resist with "
                                + QuantityText.of(contact, Dimension.STIFFNESS) + ", wires " + wire.name() + " with "
                                + QuantityText.of(lateral, Dimension.STIFFNESS),
                        "at least " + (int) SOFT + " times the wires",
                        "Raise it: softened grains squeeze through gaps that real ones do not pass.");
            }
        }
    }

    private void unusedMotions() {
        for (String motion : draft.motions.keySet()) {
            boolean used = draft.root.<Values>named("walls").values().stream().anyMatch(v -> uses(v, motion))
                    || draft.root.<Values>named("wires").values().stream().anyMatch(v -> uses(v, motion));
            if (!used) {
                rules.caution(
                        "motions." + motion,
                        "used by nothing",
                        "a wall or row of wires that names it",
                        "Add motion = \"" + motion + "\" to what should move.");
            }
        }
    }

    private static boolean uses(Values values, String motion) {
        return values.has("motion") && values.text("motion").equals(motion);
    }

    private static String length(double metres) {
        return QuantityText.of(metres, Dimension.LENGTH);
    }
}

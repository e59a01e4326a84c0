// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.ArrayList;
import java.util.List;
import reedling.error.Finding;

/** Finds every fault of a wire specification that its author can mend. Stateless. */
final class WireCheck {

    /** Beyond this stretch a linear law between stretch and pull is no description of any wire. */
    private static final double LARGEST_PRESTRETCH = 0.3;

    private final WireSpecification wire;
    private final List<Finding> findings = new ArrayList<>();

    private WireCheck(WireSpecification wire) {
        this.wire = wire;
    }

    static List<Finding> findings(WireSpecification wire) {
        WireCheck check = new WireCheck(wire);
        check.section();
        check.length();
        check.tension();
        check.damping();
        return List.copyOf(check.findings);
    }

    private void section() {
        if (wire.section() instanceof CrossSection.Tube tube
                && !(tube.innerDiameter() > 0 && tube.innerDiameter() < tube.outerDiameter())) {
            add(
                    "inner diameter",
                    tube.innerDiameter() + " m",
                    "0 < value < " + tube.outerDiameter() + " m",
                    "Make the tube's hole smaller than the tube, or use a solid round section.");
        }
        double smallest = wire.section().contactRadius();
        if (!(smallest > 0 && Double.isFinite(wire.section().area()))) {
            add(
                    "section",
                    "of smallest radius " + smallest + " m",
                    "a radius > 0",
                    "Give every size of the section as a length above 0.");
        }
    }

    private void length() {
        double span = wire.ends().span();
        double thickness = wire.section().thickness();
        if (!wire.ends().start().finite() || !wire.ends().end().finite()) {
            add("ends", "not finite", "finite coordinates", "Give both ends as points in metres.");
        } else if (!(span > thickness)) {
            add(
                    "span",
                    span + " m",
                    "above the thickness " + thickness + " m",
                    "Move the ends apart or make the wire thinner.");
        } else if (wire.elements() < 1) {
            add("elements", Integer.toString(wire.elements()), "1 or more", "Use 8 or more per half wave.");
        } else if (span / wire.elements() < thickness && !wire.rigid()) {
            add(
                    "elements",
                    wire.elements() + " of length " + span / wire.elements() + " m",
                    "at most " + (int) Math.max(1, span / thickness) + ", so that none is shorter than thick",
                    "Use fewer elements; shorter ones only shrink the step.");
        }
    }

    private void tension() {
        double tension = wire.tension();
        if (!(tension >= 0 && Double.isFinite(tension))) {
            add("tension", tension + " N", "0 N or more", "A wire cannot be installed under compression.");
        } else if (tension > 0 && !wire.rigid() && hasFreeEnd()) {
            add(
                    "tension",
                    tension + " N",
                    "0 N where an end is free",
                    "Hold both ends (pinned or clamped) or drop the tension.");
        } else if (wire.prestretch() > LARGEST_PRESTRETCH) {
            add(
                    "tension",
                    tension + " N, a stretch of " + wire.prestretch(),
                    "a stretch of at most " + LARGEST_PRESTRETCH,
                    "Lower the tension or check Young's modulus.");
        }
    }

    private void damping() {
        WireDamping damping = wire.damping();
        if (!(damping.strainDampingTime() >= 0 && Double.isFinite(damping.strainDampingTime()))) {
            add("strain damping time", damping.strainDampingTime() + " s", "0 s or more", "Use 0 s for none.");
        }
        ratio("damping ratio at the highest mode", damping.highestModeRatio());
        ratio("damping ratio of the first mode", damping.firstModeRatio());
        if (damping.highestModeRatio() > 0 && damping.strainDampingTime() > 0) {
            add("strain damping", "given as a time and as a ratio", "one of them", "Drop one.");
        }
        if (damping.firstModeRatio() > 0 && !wire.rigid() && !canStand()) {
            add(
                    "damping ratio of the first mode",
                    Double.toString(damping.firstModeRatio()),
                    "0 for a wire that its supports do not hold in place",
                    "Modal damping is relative to the supports: clamp one end or hold both.");
        }
    }

    private void ratio(String what, double value) {
        if (!(value >= 0 && value < 1)) {
            add(what, Double.toString(value), "0 <= value < 1", "Steel wires have about 0.005, polymers 0.02 to 0.1.");
        }
    }

    private boolean hasFreeEnd() {
        return wire.ends().startCondition() == EndCondition.FREE || wire.ends().endCondition() == EndCondition.FREE;
    }

    private boolean canStand() {
        return !hasFreeEnd()
                || wire.ends().startCondition() == EndCondition.CLAMPED
                || wire.ends().endCondition() == EndCondition.CLAMPED;
    }

    private void add(String what, String got, String expected, String remedy) {
        findings.add(new Finding(wire.name(), what, got, expected, remedy));
    }
}

// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Optional;
import java.util.OptionalDouble;
import org.joml.Vector3d;
import reedling.structure.CrossSection;
import reedling.structure.WireMesh;
import reedling.unit.Dimension;

/** Frequencies, mesh and drive of the rows of wires. */
final class WireFigures {

    /** Harmonics of the drive within this part of a wire's first frequency shake it in resonance. */
    private static final double NEAR = 0.05;

    /** Element length over flexural length up to which the restitution of an impact is within 7 %. */
    private static final double COARSEST = 0.6;

    private final CaseAssembly assembly;
    private final CaseSpecification specification;
    private final Fall fall;
    private final ForecastText text;

    WireFigures(CaseAssembly assembly, Fall fall, ForecastText text) {
        this.assembly = assembly;
        this.fall = fall;
        this.text = text;
        specification = assembly.reading().specification();
    }

    /** Adds all rows; {@code contact} is the shortest duration of an impact on a wire, s. */
    void write(double contact) {
        int elements = assembly.model().structure().bodies().stream()
                .mapToInt(body -> body.elementCount())
                .sum();
        if (elements == 0) {
            return;
        }
        text.heading("Wires");
        text.entry(
                "mesh",
                assembly.model().structure().bodies().size() + " wires, " + elements + " elements, "
                        + assembly.model().structure().nodes().count + " nodes");
        specification.wires().values().forEach(wire -> row(wire, contact));
    }

    private void row(WireSpecification wire, double contact) {
        String gap = wire.count() > 1
                ? ", gap " + length(wire.spacing() - wire.section().outerDiameter())
                : "";
        text.entry(wire.name(), wire.count() + " of " + length(wire.length()) + gap + (wire.rigid() ? ", rigid" : ""));
        if (!wire.rigid()) {
            bending(wire, contact);
        }
        drive(wire);
    }

    private void bending(WireSpecification wire, double contact) {
        var one = WireParts.first(specification, wire);
        CrossSection section = one.section();
        double bendingStiffness = one.material().youngsModulus() * section.secondMoment2();
        double wave = Math.sqrt(bendingStiffness / (one.material().density() * section.area()));
        double lateral = lateralStiffness(wire, bendingStiffness);
        text.entry(
                "  tension",
                ForecastText.figure(wire.tension(), Dimension.FORCE) + ", strain "
                        + ForecastText.number(100 * one.prestretch()) + " %, stress "
                        + ForecastText.figure(wire.tension() / section.area(), Dimension.PRESSURE) + ", stiffness at "
                        + "mid-span " + ForecastText.figure(lateral, Dimension.STIFFNESS));
        frequency(wire, WireMesh.firstAngularFrequency(one) / (2 * Math.PI));
        double element = wire.elementLength();
        double flexural = Math.sqrt(contact * wave);
        text.entry(
                "  element length", length(element) + "; flexural length sqrt(T c_b) of an impact " + length(flexural));
        if (element > COARSEST * flexural) {
            text.caution("elements of " + wire.name() + " above " + COARSEST + " of the flexural length look too heavy"
                    + " to an impact: " + (int) Math.ceil(wire.length() / (COARSEST * flexural)) + " elements would do,"
                    + " at a smaller step.");
        }
        clampLayer(wire, bendingStiffness);
    }

    private void clampLayer(WireSpecification wire, double bendingStiffness) {
        boolean clamped = wire.startSupport() == WireSupport.CLAMPED || wire.endSupport() == WireSupport.CLAMPED;
        if (!clamped || wire.tension() == 0) {
            return;
        }
        double layer = Math.sqrt(bendingStiffness / wire.tension());
        text.entry("  layer at the clamps", "sqrt(EI/T) = " + length(layer));
        if (wire.elementLength() > layer / 2) {
            text.caution("elements of " + wire.name()
                    + " are longer than half of the layer at the clamps: bending stress" + " there comes out too low.");
        }
    }

    /** At mid-span: 4 T/L + 192 EI/L^3 (textbook, clamped ends), N/m. */
    static double lateralStiffness(WireSpecification wire, double bendingStiffness) {
        double length = wire.length();
        return 4 * wire.tension() / length + 192 * bendingStiffness / (length * length * length);
    }

    private void frequency(WireSpecification wire, double first) {
        OptionalDouble drive = driveOf(wire).map(WireFigures::vibration).orElse(OptionalDouble.empty());
        String beside = drive.isPresent()
                ? ", " + ForecastText.number(first / drive.getAsDouble()) + " times the drive's "
                        + ForecastText.figure(drive.getAsDouble(), Dimension.FREQUENCY)
                : "";
        text.entry("  first lateral mode", ForecastText.figure(first, Dimension.FREQUENCY) + " without a bed" + beside);
        if (drive.isPresent()) {
            long harmonic = Math.max(1, Math.round(first / drive.getAsDouble()));
            double off = first / (harmonic * drive.getAsDouble()) - 1;
            if (Math.abs(off) < NEAR) {
                text.caution("the first lateral mode of " + wire.name() + ", "
                        + ForecastText.figure(first, Dimension.FREQUENCY) + ", is within 5 % of harmonic " + harmonic
                        + " of the drive, " + ForecastText.figure(harmonic * drive.getAsDouble(), Dimension.FREQUENCY)
                        + ": try another tension too.");
            }
        }
    }

    private Optional<MotionSpecification> driveOf(WireSpecification wire) {
        return wire.motion().map(specification.motions()::get);
    }

    private static OptionalDouble vibration(MotionSpecification motion) {
        return switch (motion.path()) {
            case MotionSpecification.Harmonic harmonic -> OptionalDouble.of(harmonic.frequency());
            case MotionSpecification.Elliptic elliptic -> OptionalDouble.of(elliptic.frequency());
            case MotionSpecification.ConstantVelocity straight -> OptionalDouble.empty();
            case MotionSpecification.Rotation turning -> OptionalDouble.empty();
        };
    }

    /** Machine acceleration A w^2 / g and throw index A w^2 (u . n) / (g . n), n normal to the row (common practice). */
    private void drive(WireSpecification wire) {
        double g = fall.gravity().length();
        if (g > 0
                && driveOf(wire).map(MotionSpecification::path).orElse(null)
                        instanceof MotionSpecification.Harmonic harmonic) {
            double omega = 2 * Math.PI * harmonic.frequency();
            double acceleration = harmonic.amplitude() * omega * omega;
            String index = "";
            Vector3d normal = new Vector3d(wire.end()).sub(wire.start()).cross(wire.pitch());
            if (normal.length() > 0) {
                normal.normalize();
                double across =
                        Math.abs(new Vector3d(harmonic.direction()).normalize().dot(normal));
                index = ", throw index "
                        + ForecastText.number(
                                acceleration * across / Math.abs(fall.gravity().dot(normal)));
            }
            text.entry(
                    "  drive",
                    "stroke " + length(2 * harmonic.amplitude()) + ", "
                            + ForecastText.figure(harmonic.frequency(), Dimension.FREQUENCY) + ", acceleration "
                            + ForecastText.number(acceleration / g) + " g" + index);
        }
    }

    private static String length(double metres) {
        return ForecastText.figure(metres, Dimension.LENGTH);
    }
}

// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import reedling.contact.ContactKind;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;
import reedling.run.Model;
import reedling.unit.Dimension;

/** How softly grains of each lot meet each other, walls and wires at the fastest impact. */
final class ImpactFigures {

    /** Largest overlap over radius that passes without a word; without damping and at the fastest impact. */
    private static final double DEEP = 0.1;

    /** Largest overlap on wires over the difference of grain and gap. */
    private static final double TRAP = 0.1;

    /** Overlap over radius at which the stiffness of a contact is told. */
    private static final double TYPICAL = 0.01;

    /** Least stiffness of a contact over that of a wire. */
    private static final double STIFF = 20;

    private record Partner(ContactKind kind, String material, double wireRadius) {}

    private final CaseSpecification specification;
    private final Model model;
    private final double speed;

    ImpactFigures(CaseAssembly assembly, double speed) {
        specification = assembly.reading().specification();
        model = assembly.model();
        this.speed = speed;
    }

    /** Shortest duration of an impact of some kinds as the normal law tells it, s; infinite if there is none. */
    double shortest(ContactKind... kinds) {
        double shortest = Double.POSITIVE_INFINITY;
        for (LotSpecification lot : specification.lots().values()) {
            for (Partner partner : partners()) {
                if (List.of(kinds).contains(partner.kind)) {
                    Impact impact = impact(lot, 0.5 * lot.diameter().smallest(), partner);
                    MaterialTable table = model.materials();
                    int pair = MaterialTable.pairIndex(table.indexOf(lot.material()), table.indexOf(partner.material));
                    double duration = model.laws()
                            .bound(partner.kind, pair)
                            .normal()
                            .duration(speed, impact.radius(), impact.mass());
                    shortest = Math.min(shortest, duration);
                }
            }
        }
        return shortest;
    }

    void writeTo(ForecastText text) {
        text.heading("Softness, at an impact of " + ForecastText.figure(speed, Dimension.SPEED) + " without damping");
        for (LotSpecification lot : specification.lots().values()) {
            double radius = 0.5 * lot.diameter().typical();
            double deepest = partners().stream()
                    .mapToDouble(partner -> impact(lot, radius, partner).overlap(speed) / radius)
                    .max()
                    .orElse(0);
            text.entry("lot " + lot.name(), "overlap " + ForecastText.number(100 * deepest) + " % of the radius");
            if (deepest > DEEP) {
                text.caution("grains of " + lot.name() + " are soft for this speed: raise youngs_modulus of "
                        + lot.material() + ".");
            }
            specification.wires().values().forEach(wire -> onWire(lot, radius, wire, text));
        }
        lawCautions().forEach(text::caution);
        if (!specification.wires().isEmpty()) {
            text.line("  Softened grains squeeze through gaps that real ones do not pass: repeat with four times"
                    + " youngs_modulus before trusting a passage.");
        }
    }

    /** What the laws say of the contacts of typical grains, each thing once. */
    private Set<String> lawCautions() {
        Set<String> cautions = new LinkedHashSet<>();
        MaterialTable table = model.materials();
        for (LotSpecification lot : specification.lots().values()) {
            for (Partner partner : partners()) {
                MaterialPair pair = table.pair(table.indexOf(lot.material()), table.indexOf(partner.material));
                double radius =
                        impact(lot, 0.5 * lot.diameter().typical(), partner).radius();
                cautions.addAll(model.laws().cautions(pair, radius));
            }
        }
        return cautions;
    }

    private void onWire(LotSpecification lot, double radius, WireSpecification wire, ForecastText text) {
        Impact impact = impact(
                lot,
                radius,
                new Partner(
                        ContactKind.GRAIN_WIRE,
                        wire.material(),
                        0.5 * wire.section().outerDiameter()));
        var one = WireParts.first(specification, wire);
        double bending = one.material().youngsModulus() * one.section().secondMoment2();
        if (!wire.rigid()) {
            double ratio = impact.stiffness(TYPICAL * radius) / WireFigures.lateralStiffness(wire, bending);
            text.entry(
                    "  on " + wire.name(),
                    "contact " + ForecastText.number(ratio) + " times as stiff as a wire"
                            + (ratio < STIFF ? ", less than " + (int) STIFF : ""));
        }
        if (wire.count() > 1) {
            trap(lot, wire, impact.overlap(speed), text);
        }
    }

    private void trap(LotSpecification lot, WireSpecification wire, double overlap, ForecastText text) {
        double gap = wire.spacing() - wire.section().outerDiameter();
        double difference = Math.abs(lot.diameter().typical() - gap);
        text.entry(
                "  in gaps of " + wire.name(),
                "overlap " + ForecastText.figure(overlap, Dimension.LENGTH) + ", "
                        + ForecastText.number(100 * overlap / difference) + " % of |grain - gap| = "
                        + ForecastText.figure(difference, Dimension.LENGTH));
        if (overlap > TRAP * difference) {
            text.caution("overlap of " + lot.name() + " on wires may exceed 10 % of |grain - gap|: the fastest impacts"
                    + " blur the cut; see the overlaps of the summary.");
        }
    }

    private List<Partner> partners() {
        List<Partner> partners = new ArrayList<>();
        specification
                .lots()
                .values()
                .forEach(lot -> partners.add(new Partner(ContactKind.GRAIN_GRAIN, lot.material(), 0)));
        specification
                .walls()
                .values()
                .forEach(wall -> partners.add(new Partner(ContactKind.GRAIN_WALL, wall.material(), 0)));
        specification
                .wires()
                .values()
                .forEach(wire -> partners.add(new Partner(
                        ContactKind.GRAIN_WIRE,
                        wire.material(),
                        0.5 * wire.section().outerDiameter())));
        return partners.stream().distinct().toList();
    }

    /**
     * Against its like half of radius and mass, against a flat wall all of it. On a wire the mean of both principal radii
     * stands for the exact line contact, within 10 % for grains up to ten times as thick as the wire.
     */
    private Impact impact(LotSpecification lot, double radius, Partner partner) {
        MaterialTable table = model.materials();
        int own = table.indexOf(lot.material());
        MaterialPair pair = table.pair(own, table.indexOf(partner.material));
        double mass = table.materials().get(own).density() * 4 / 3 * Math.PI * radius * radius * radius;
        double modulus = pair.contactModulus();
        return switch (partner.kind) {
            case GRAIN_GRAIN -> new Impact(modulus, radius / 2, mass / 2);
            case GRAIN_WALL -> new Impact(modulus, radius, mass);
            case GRAIN_WIRE ->
                new Impact(
                        modulus, Math.sqrt(radius * radius * partner.wireRadius / (radius + partner.wireRadius)), mass);
        };
    }
}

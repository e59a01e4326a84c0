// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Arrays;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.material.Material;
import reedling.material.MaterialTable;
import reedling.structure.CrossSection;
import reedling.structure.ElementType;
import reedling.structure.EndCondition;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;

/** Wires of a case: each row becomes as many bodies, named {@code deck 1}, {@code deck 2} and so on. */
final class WireParts {

    /** Bodies of one row: the first and how many. */
    record Row(int first, int count) {}

    private final StructureBuilder builder;
    private final MotionParts motions;
    private final Map<String, Integer> motionIndex = new HashMap<>();
    private final Map<String, Row> rows = new LinkedHashMap<>();
    private int[] materialOfBody = {};

    private WireParts(Position gravity, MotionParts motions) {
        builder = new StructureBuilder().gravity(gravity);
        this.motions = motions;
    }

    static WireParts make(
            CaseReading reading, CasePlugins plugins, LawParts laws, MotionParts motions, PartFaults faults) {
        WireParts parts = new WireParts(laws.gravity(), motions);
        CaseSpecification specification = reading.specification();
        MaterialTable table = MaterialParts.table(specification);
        specification.wires().forEach((name, wire) -> {
            String path = "wires." + name;
            faults.make(path, () -> {
                ElementType type = plugins.element(wire.element().name(), reading.where(path));
                return parts.row(wire, table, type);
            });
        });
        return parts;
    }

    Structure structure() {
        return builder.build();
    }

    int[] materialOfBody() {
        return materialOfBody.clone();
    }

    /** Bodies of each row by name. */
    Map<String, Row> rows() {
        return rows;
    }

    private Row row(WireSpecification wire, MaterialTable table, ElementType type) {
        int first = materialOfBody.length;
        int material = table.indexOf(wire.material());
        materialOfBody = Arrays.copyOf(materialOfBody, first + wire.count());
        for (int k = 0; k < wire.count(); k++) {
            materialOfBody[first + k] = material;
            WireMesh.add(builder, one(wire, k, table.materials().get(material), motion(wire)), type);
        }
        Row row = new Row(first, wire.count());
        rows.put(wire.name(), row);
        return row;
    }

    private int motion(WireSpecification wire) {
        return wire.motion()
                .map(name -> motionIndex.computeIfAbsent(
                        name, key -> builder.motion(new DrivenSupport(motions.of(wire.motion())))))
                .orElse(WireEnds.AT_REST);
    }

    /** One wire of a row as the structure wants it. */
    private static reedling.structure.WireSpecification one(
            WireSpecification wire, int number, Material material, int motion) {
        Vector3d shift = new Vector3d(wire.pitch()).mul(number);
        WireEnds ends = new WireEnds(
                position(wire.start(), shift),
                position(wire.end(), shift),
                EndCondition.valueOf(wire.startSupport().name()),
                EndCondition.valueOf(wire.endSupport().name()),
                motion);
        return new reedling.structure.WireSpecification(
                wire.name() + " " + (number + 1),
                material,
                section(wire.section()),
                ends,
                wire.elements(),
                wire.tension(),
                new WireDamping(wire.strainDamping(), 0, wire.firstModeDamping()),
                wire.element().name(),
                wire.element().parameters().values(),
                wire.rigid());
    }

    /** The first wire of a row, its supports at rest: for figures of a single wire. */
    static reedling.structure.WireSpecification first(CaseSpecification specification, WireSpecification wire) {
        Material material = Objects.requireNonNull(specification.materials().get(wire.material()));
        return one(wire, 0, material, WireEnds.AT_REST);
    }

    private static CrossSection section(WireSection section) {
        return switch (section) {
            case WireSection.Round round -> new CrossSection.SolidCircle(round.outerDiameter());
            case WireSection.Tube tube -> new CrossSection.Tube(tube.outerDiameter(), tube.innerDiameter());
        };
    }

    private static Position position(Vector3dc point, Vector3dc shift) {
        return new Position(point.x() + shift.x(), point.y() + shift.y(), point.z() + shift.z());
    }
}

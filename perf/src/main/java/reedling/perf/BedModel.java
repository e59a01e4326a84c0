// SPDX-License-Identifier: Apache-2.0
package reedling.perf;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.joml.Vector3d;
import reedling.contact.ContactLaw;
import reedling.contact.LawSet;
import reedling.contact.Stage;
import reedling.field.Field;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;
import reedling.particle.GrainStore;
import reedling.particle.Lot;
import reedling.particle.SingleSize;
import reedling.plugin.ParameterValues;
import reedling.plugins.contact.HertzProvider;
import reedling.plugins.contact.MindlinProvider;
import reedling.plugins.contact.RollingProvider;
import reedling.plugins.field.GravityProvider;
import reedling.run.Exits;
import reedling.run.Model;
import reedling.run.StepSettings;
import reedling.structure.StructureBuilder;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/** Makes a run from a dense bed: one or three materials of equal numbers, the built-in laws, gravity and six walls. */
final class BedModel {

    /** Young's modulus of the bed's grains, Pa; soft, as beds are usually run. */
    private static final double MODULUS = 1e8;

    private static final double POISSON = 0.3;
    private static final double DENSITY = 2500; // kg/m3
    private static final double RESTITUTION = 0.7;
    private static final double FRICTION = 0.5;
    private static final double ROLLING_FRICTION = 0.1;
    private static final double MARGIN_SHARE = 0.3;
    private static final int STEPS_PER_CONTACT = 20;
    private static final int REPORT_EVERY = 256;

    private BedModel() {}

    static Model of(DenseBed bed, int materials) {
        MaterialTable table = table(materials);
        GrainStore grains = new GrainStore();
        double radii = 0;
        grains.reserve(bed.count());
        for (int g = 0; g < bed.count(); g++) {
            int at = DenseBed.ROW * g;
            double[] r = bed.rows();
            int row = grains.add(r[at], r[at + 1], r[at + 2], r[at + 3], DENSITY, g % materials, 0);
            grains.velocity(row, r[at + 4], r[at + 5], r[at + 6]);
            grains.spin(row, r[at + 7], r[at + 8], r[at + 9]);
            radii += r[at + 3];
        }
        double margin = MARGIN_SHARE * radii / bed.count();
        return new Model(
                table,
                List.of(new Lot("bed", 0, new SingleSize(1e-3))),
                grains,
                new StructureBuilder().build(),
                new int[0],
                walls(bed.edges()),
                List.of(gravity()),
                laws(table),
                List.of(),
                Exits.none(),
                new StepSettings(STEPS_PER_CONTACT, 1e-3, Double.POSITIVE_INFINITY, margin, REPORT_EVERY));
    }

    private static MaterialTable table(int count) {
        List<Material> materials = new java.util.ArrayList<>();
        List<MaterialPair> pairs = new java.util.ArrayList<>();
        for (int k = 0; k < count; k++) {
            materials.add(new Material("bed " + k, DENSITY, MODULUS, POISSON));
            for (Material other : materials) {
                pairs.add(new MaterialPair(materials.get(k), other, RESTITUTION, FRICTION, ROLLING_FRICTION));
            }
        }
        return new MaterialTable(materials, pairs);
    }

    private static LawSet laws(MaterialTable table) {
        Map<Stage, ContactLaw> laws = new EnumMap<>(Stage.class);
        RollingProvider rolling = new RollingProvider();
        HertzProvider hertz = new HertzProvider();
        laws.put(Stage.NORMAL, hertz.create(ParameterValues.of(hertz, Map.of())));
        laws.put(Stage.TANGENTIAL, new MindlinProvider().create(new ParameterValues(Map.of())));
        laws.put(Stage.ROLLING, rolling.create(ParameterValues.of(rolling, Map.of())));
        return new LawSet(laws, table);
    }

    private static Field gravity() {
        GravityProvider provider = new GravityProvider();
        return provider.create(ParameterValues.of(provider, Map.of()));
    }

    private static List<Wall> walls(double[] edges) {
        List<Wall> walls = new java.util.ArrayList<>();
        for (int axis = 0; axis < 3; axis++) {
            for (int side = 0; side < 2; side++) {
                Vector3d point = new Vector3d().setComponent(axis, side * edges[axis]);
                Vector3d inwards = new Vector3d().setComponent(axis, side == 0 ? 1 : -1);
                walls.add(new Wall(
                        "side " + walls.size(), 0, new HalfSpace(), Placement.facing(point, inwards), new Still()));
            }
        }
        return walls;
    }
}

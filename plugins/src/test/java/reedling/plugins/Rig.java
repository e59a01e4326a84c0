// SPDX-License-Identifier: Apache-2.0
package reedling.plugins;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import reedling.contact.ContactLaw;
import reedling.contact.LawSet;
import reedling.contact.Stage;
import reedling.feed.RainFeed;
import reedling.field.Field;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.particle.Lot;
import reedling.particle.SingleSize;
import reedling.plugin.ParameterValues;
import reedling.plugins.contact.HertzProvider;
import reedling.plugins.contact.MindlinProvider;
import reedling.plugins.contact.RollingProvider;
import reedling.plugins.field.GravityProvider;
import reedling.run.Exits;
import reedling.run.MidpointRule;
import reedling.run.Model;
import reedling.run.Simulation;
import reedling.run.StepSettings;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;
import reedling.wall.Wall;

/** Puts a small run together in a test: one or more materials, grains placed by hand, walls, the built-in laws. */
public final class Rig {

    private final List<Material> materials = new ArrayList<>();
    private final List<MaterialPair> pairs = new ArrayList<>();
    private final List<Wall> walls = new ArrayList<>();
    private final List<Field> fields = new ArrayList<>();
    private final GrainStore grains = new GrainStore();
    private final Map<Stage, ContactLaw> laws = new EnumMap<>(Stage.class);
    private final List<Model.FeedLine> feeds = new ArrayList<>();
    private Exits exits = Exits.none();
    private Structure structure = new StructureBuilder().build();
    private int[] materialOfBody = new int[0];
    private int stepsPerContact = 20;
    private double maximumStep = 1e-3;
    private double margin = 1e-3;
    private int reportEvery = 1;
    private Optional<MidpointRule> midpoint = Optional.empty();

    /** Hertz, Mindlin and rolling resistance. */
    public Rig() {
        HertzProvider hertz = new HertzProvider();
        laws.put(Stage.NORMAL, hertz.create(ParameterValues.of(hertz, Map.of())));
        laws.put(Stage.TANGENTIAL, new MindlinProvider().create(new ParameterValues(Map.of())));
        RollingProvider rolling = new RollingProvider();
        laws.put(Stage.ROLLING, rolling.create(ParameterValues.of(rolling, Map.of())));
    }

    /** Adds a material with its pairs to all earlier ones and itself, all with the same numbers. */
    public Rig material(Material material, double restitution, double friction, double rollingFriction) {
        materials.add(material);
        for (Material other : materials) {
            pairs.add(new MaterialPair(material, other, restitution, friction, rollingFriction));
        }
        return this;
    }

    public Rig without(Stage stage) {
        laws.remove(stage);
        return this;
    }

    public Rig law(Stage stage, ContactLaw law) {
        laws.put(stage, law);
        return this;
    }

    public Rig wall(Wall wall) {
        walls.add(wall);
        return this;
    }

    public Rig exits(Exits where) {
        exits = where;
        return this;
    }

    /** Adds a feed of the one lot of the rig. */
    public Rig feed(RainFeed feed) {
        feeds.add(new Model.FeedLine(feed, new int[] {0}));
        return this;
    }

    /** The materials added so far. */
    public MaterialTable table() {
        return new MaterialTable(materials, pairs);
    }

    public Rig gravity(double x, double y, double z) {
        GravityProvider provider = new GravityProvider();
        fields.add(provider.create(ParameterValues.of(provider, Map.of("x", x, "y", y, "z", z))));
        return this;
    }

    public Rig field(Field field) {
        fields.add(field);
        return this;
    }

    public Rig structure(Structure made, int... bodyMaterials) {
        structure = made;
        materialOfBody = bodyMaterials;
        return this;
    }

    public Rig stepsPerContact(int number) {
        stepsPerContact = number;
        return this;
    }

    public Rig maximumStep(double seconds) {
        maximumStep = seconds;
        return this;
    }

    public Rig margin(double metres) {
        margin = metres;
        return this;
    }

    /** Steps by the midpoint rule. */
    public Rig midpoint(double theta, double tolerance) {
        midpoint = Optional.of(new MidpointRule(theta, tolerance));
        return this;
    }

    public Rig reportEvery(int steps) {
        reportEvery = steps;
        return this;
    }

    /** Adds a grain of a material and returns its id. */
    public long grain(int material, double radius, double[] centre, double[] velocity, double[] spin) {
        int g = grains.add(
                centre[0], centre[1], centre[2], radius, materials.get(material).density(), material, 0);
        grains.velocity(g, velocity[0], velocity[1], velocity[2]);
        grains.spin(g, spin[0], spin[1], spin[2]);
        return grains.id()[g];
    }

    public GrainStore grains() {
        return grains;
    }

    /** The run before it begins, for a checkpoint to be restored into. */
    public Simulation simulation(WorkerTeam team) {
        MaterialTable table = table();
        Model model = new Model(
                table,
                List.of(new Lot("all", 0, new SingleSize(1e-3))),
                grains,
                structure,
                materialOfBody,
                walls,
                fields,
                new LawSet(laws, table),
                feeds,
                exits,
                new StepSettings(
                        stepsPerContact, maximumStep, Double.POSITIVE_INFINITY, margin, reportEvery, midpoint));
        return new Simulation(model, team);
    }

    public Simulation start(WorkerTeam team) {
        Simulation simulation = simulation(team);
        simulation.begin();
        return simulation;
    }

    /** Row of a grain by its id. */
    public int row(long id) {
        for (int g = 0; g < grains.count(); g++) {
            if (grains.id()[g] == id) {
                return g;
            }
        }
        throw new IllegalArgumentException("no grain " + id);
    }

    /** Velocity of a grain, m/s. */
    public double[] velocity(long id) {
        return three(id, GrainRow.V);
    }

    /** Spin of a grain, rad/s. */
    public double[] spin(long id) {
        return three(id, GrainRow.W);
    }

    /** Centre of a grain, m. */
    public double[] centre(long id) {
        return three(id, GrainRow.X);
    }

    private double[] three(long id, int offset) {
        int at = GrainRow.at(row(id)) + offset;
        double[] rows = grains.rows();
        return new double[] {rows[at], rows[at + 1], rows[at + 2]};
    }
}

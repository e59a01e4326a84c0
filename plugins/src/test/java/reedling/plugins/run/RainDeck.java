// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.joml.Vector3d;
import reedling.contact.ContactLaw;
import reedling.contact.LawSet;
import reedling.contact.Stage;
import reedling.feed.BoxRegion;
import reedling.feed.FeedRate;
import reedling.feed.Launch;
import reedling.feed.LotMix;
import reedling.feed.LotShare;
import reedling.feed.Rain;
import reedling.feed.RainFeed;
import reedling.field.Field;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;
import reedling.particle.GrainStore;
import reedling.particle.Lot;
import reedling.particle.RandomStream;
import reedling.particle.UniformSize;
import reedling.plugin.ParameterValues;
import reedling.plugins.contact.HertzProvider;
import reedling.plugins.contact.MindlinProvider;
import reedling.plugins.contact.RollingProvider;
import reedling.plugins.element.BeamElement;
import reedling.plugins.field.GravityProvider;
import reedling.probe.PegRule;
import reedling.run.Exits;
import reedling.run.Model;
import reedling.run.RunIdentity;
import reedling.run.RunPlan;
import reedling.run.ScreenPlan;
import reedling.run.StepSettings;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;
import reedling.structure.SupportMotion;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;
import reedling.structure.WireSpecification;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/** Six short bending wires, shaken and sloped, between two side walls, under a rain of two lots: a screen in small. */
final class RainDeck {

    static final int WIRES = 6;
    static final double PITCH = 7.4e-3;
    static final double SPAN = 0.06;
    static final double TENSION = 8;

    private static final Material GRAIN = new Material("grain", 1280, 5e6, 0.3);
    private static final Material POLYURETHANE = new Material("polyurethane", 1200, 6e7, 0.45);
    private static final SupportMotion SHAKER = (time, pose) -> {
        double s = 0.0025 * StrictMath.sin(2 * Math.PI * 20 * time) / Math.sqrt(2);
        pose[0] = s;
        pose[1] = 0;
        pose[2] = s;
        pose[3] = 1;
        pose[4] = 0;
        pose[5] = 0;
        pose[6] = 0;
    };

    private final boolean shaken;
    private double perSecond = 1500;
    private double longest = 1e-3;
    private final GrainStore grains = new GrainStore();

    private RainDeck(boolean shaken) {
        this.shaken = shaken;
    }

    static RainDeck shaken() {
        return new RainDeck(true);
    }

    static RainDeck still() {
        return new RainDeck(false);
    }

    RainDeck feeding(double grainsPerSecond) {
        perSecond = grainsPerSecond;
        return this;
    }

    RainDeck longestStep(double seconds) {
        longest = seconds;
        return this;
    }

    /** Adds a product grain at rest. */
    RainDeck grain(double x, double y, double z, double radius) {
        grains.add(x, y, z, radius, GRAIN.density(), 0, 1);
        return this;
    }

    GrainStore grains() {
        return grains;
    }

    Structure structure() {
        StructureBuilder builder = new StructureBuilder().gravity(new Position(0, 0, -9.81));
        int motion = shaken ? builder.motion(SHAKER) : WireEnds.AT_REST;
        for (int k = 0; k < WIRES; k++) {
            double y = PITCH * k;
            double drop = shaken ? -0.015 : 0;
            WireEnds ends = new WireEnds(
                    new Position(0, y, 0),
                    new Position(SPAN, y, drop),
                    EndCondition.CLAMPED,
                    EndCondition.CLAMPED,
                    motion);
            WireMesh.add(
                    builder,
                    new WireSpecification(
                            "wire " + (k + 1),
                            POLYURETHANE,
                            new CrossSection.SolidCircle(0.002),
                            ends,
                            16,
                            TENSION,
                            new WireDamping(0, 0.05, 0.05),
                            "beam",
                            Map.of(),
                            false),
                    new BeamElement());
        }
        return builder.build();
    }

    Model model() {
        MaterialTable table = new MaterialTable(
                List.of(GRAIN, POLYURETHANE),
                List.of(
                        new MaterialPair(GRAIN, GRAIN, 0.5, 0.3, 0.03),
                        new MaterialPair(GRAIN, POLYURETHANE, 0.5, 0.25, 0.03),
                        new MaterialPair(POLYURETHANE, POLYURETHANE, 0.5, 0.25, 0.03)));
        List<Lot> lots = List.of(
                new Lot("vetch", 0, new UniformSize(3.6e-3, 5.2e-3)),
                new Lot("peas", 0, new UniformSize(5.0e-3, 7.0e-3)));
        Map<Stage, ContactLaw> laws = new EnumMap<>(Stage.class);
        HertzProvider hertz = new HertzProvider();
        laws.put(Stage.NORMAL, hertz.create(ParameterValues.of(hertz, Map.of())));
        laws.put(Stage.TANGENTIAL, new MindlinProvider().create(new ParameterValues(Map.of())));
        RollingProvider rolling = new RollingProvider();
        laws.put(Stage.ROLLING, rolling.create(ParameterValues.of(rolling, Map.of())));
        GravityProvider gravity = new GravityProvider();
        Field down = gravity.create(ParameterValues.of(gravity, Map.of("x", 0.0, "y", 0.0, "z", -9.81)));
        return new Model(
                table,
                lots,
                grains,
                structure(),
                IntStream.range(0, WIRES).map(k -> 1).toArray(),
                List.of(side("left", -3.7e-3, 1), side("right", PITCH * (WIRES - 1) + 3.7e-3, -1)),
                List.of(down),
                new LawSet(laws, table),
                perSecond > 0 ? List.of(new Model.FeedLine(rain(lots, table), new int[] {0, 1})) : List.of(),
                exits(),
                new StepSettings(20, longest, shaken ? 0.05 : Double.POSITIVE_INFINITY, 1e-3, 20));
    }

    private static Wall side(String name, double y, double normal) {
        return new Wall(
                name,
                1,
                new HalfSpace(),
                Placement.facing(new Vector3d(0, y, 0), new Vector3d(0, normal, 0)),
                new Still());
    }

    private RainFeed rain(List<Lot> lots, MaterialTable table) {
        LotMix mix = new LotMix(List.of(new LotShare(lots.get(0), 0.5), new LotShare(lots.get(1), 0.5)), table);
        BoxRegion region = new BoxRegion(new Vector3d(0.005, 0, 0.015), new Vector3d(0.03, PITCH * (WIRES - 1), 0.03));
        double never = Double.POSITIVE_INFINITY;
        FeedRate rate = new FeedRate(FeedRate.Measure.COUNT, perSecond, never, 0, never);
        return new RainFeed(
                new Rain("rain", mix, region, rate, new Launch(new Vector3d(0.3, 0, -0.8), 0.05, 20)),
                new RandomStream(7));
    }

    private static Exits exits() {
        return new Exits(
                List.of(
                        new Exits.Outlet("below", new double[] {-0.1, -0.1, -0.2, 0.075, 0.2, -0.03}),
                        new Exits.Outlet("end", new double[] {0.075, -0.1, -0.2, 0.3, 0.2, 0.1})),
                new double[] {-0.1, -0.1, -0.2, 0.3, 0.2, 0.2});
    }

    static RunPlan plan(double endTime, double measureFrom) {
        ScreenPlan screen = new ScreenPlan(
                IntStream.range(0, WIRES).toArray(),
                0,
                1,
                0,
                1,
                new PegRule(0.03, 0.5e-3),
                measureFrom,
                new ScreenPlan.Limits(
                        OptionalDouble.of(0.9), OptionalDouble.of(0.05), OptionalDouble.of(5), OptionalDouble.of(2e6)));
        return new RunPlan(endTime, new RunPlan.Intervals(0.02, 0.01, 0.05, 1e9), Optional.of(screen), identity());
    }

    static RunIdentity identity() {
        return new RunIdentity("A screen in small", "test", "0123", Map.of("hertz", 1), 7, List.of("A caution."));
    }
}

// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.joml.Vector3d;
import org.joml.Vector3dc;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.material.Material;

/** The geometry of the shipped decks does what their comments say, worked out from the numbers a second time. */
class WireDeckTest {

    private static final double SLOPE = Math.toRadians(5);

    private static CaseSpecification read(String name) {
        Path file = Path.of("..", "cases", name, "case.toml");
        return CaseFile.read(file, List.of(), Cases::providers).specification();
    }

    private static double largestRadius(CaseSpecification spec) {
        return 0.5
                * spec.lots().values().stream()
                        .mapToDouble(lot -> lot.diameter().largest())
                        .max()
                        .orElseThrow();
    }

    private static double smallestRadius(CaseSpecification spec) {
        return 0.5
                * spec.lots().values().stream()
                        .mapToDouble(lot -> lot.diameter().smallest())
                        .min()
                        .orElseThrow();
    }

    @ParameterizedTest
    @ValueSource(strings = {"wire-deck", "first-look"})
    void deckFallsByFiveDegreesAndIsThrownAtFortyFive(String name) {
        CaseSpecification spec = read(name);
        WireSpecification deck = spec.wires().get("deck");
        Vector3d along = new Vector3d(deck.end()).sub(deck.start());
        assertThat(Math.atan2(-along.z, along.x)).isCloseTo(SLOPE, within(1e-4));
        MotionSpecification.Harmonic path =
                (MotionSpecification.Harmonic) spec.motions().get("throw").path();
        assertThat(along.angle(new Vector3d(path.direction()))).isCloseTo(Math.toRadians(45), within(1e-4));
        assertThat(deck.spacing() - deck.section().outerDiameter()).isCloseTo(5.4e-3, within(1e-9));
    }

    @ParameterizedTest
    @ValueSource(strings = {"wire-deck", "first-look"})
    void noGrainFitsBetweenTheOutermostWiresAndTheSideWalls(String name) {
        CaseSpecification spec = read(name);
        WireSpecification deck = spec.wires().get("deck");
        double first = deck.start().y();
        double last = first + (deck.count() - 1) * deck.pitch().y();
        double left =
                ((WallShape.Plane) spec.walls().get("left").shape()).point().y();
        double right =
                ((WallShape.Plane) spec.walls().get("right").shape()).point().y();
        assertThat(left).isEqualTo(-right);
        double closest = deck.section().outerDiameter() / 2 + 2 * smallestRadius(spec);
        assertThat(first - left).isBetween(0.0, closest);
        assertThat(right - last).isCloseTo(first - left, within(1e-12));
    }

    @ParameterizedTest
    @ValueSource(strings = {"wire-deck", "first-look"})
    void outletsLeaveNoWayOutBetweenThem(String name) {
        CaseSpecification spec = read(name);
        BoxRegion passed = spec.outlets().get("passed").box();
        BoxRegion over = spec.outlets().get("over").box();
        BoxRegion bounds = spec.bounds();
        WireSpecification deck = spec.wires().get("deck");
        MotionSpecification.Harmonic path =
                (MotionSpecification.Harmonic) spec.motions().get("throw").path();
        Vector3d swing = new Vector3d(path.direction()).normalize(path.amplitude());
        // below: the whole floor of the bounds; beyond the end: everything above that
        assertThat(passed.minimum()).isEqualTo(bounds.minimum());
        assertThat(passed.maximum().x()).isEqualTo(bounds.maximum().x());
        assertThat(over.minimum().z()).isEqualTo(passed.maximum().z());
        assertThat(over.maximum()).isEqualTo(bounds.maximum());
        // a grain caught in a gap, its centre one radius below the wires at most, is not yet counted as passed
        double lowest = deck.end().z() - swing.z - deck.section().outerDiameter() / 2;
        assertThat(lowest - passed.maximum().z()).isGreaterThan(largestRadius(spec));
        // a grain on the wires at rest is not yet over; one that rolls off the tip is, before it has fallen
        assertThat(over.minimum().x()).isBetween(deck.end().x(), deck.end().x() + smallestRadius(spec));
    }

    @ParameterizedTest
    @ValueSource(strings = {"wire-deck", "first-look"})
    void rainStartsClearOfWallsAndWires(String name) {
        CaseSpecification spec = read(name);
        BoxRegion region = (BoxRegion) spec.feeds().get("inlet").region();
        double radius = largestRadius(spec);
        MotionSpecification.Harmonic path =
                (MotionSpecification.Harmonic) spec.motions().get("throw").path();
        Vector3d swing = new Vector3d(path.direction()).normalize(path.amplitude());
        for (String wall : List.of("left", "right", "back")) {
            WallShape.Plane plane = (WallShape.Plane) spec.walls().get(wall).shape();
            for (Vector3dc corner : List.of(region.minimum(), region.maximum())) {
                double gap = new Vector3d(corner).sub(plane.point()).dot(plane.normal());
                assertThat(gap).as(wall).isGreaterThan(radius + Math.abs(swing.dot(plane.normal())));
            }
        }
        double wire = spec.wires().get("deck").section().outerDiameter() / 2;
        assertThat(region.minimum().z()).isGreaterThan(radius + wire + swing.z);
        assertThat(spec.walls().values()).allMatch(wall -> wall.motion().equals(Optional.of("throw")));
    }

    /** Textbook formulas with the numbers of the case; the figures are those its comments state. */
    @Test
    void commentsOfTheFullDeckAreTrue() {
        CaseSpecification spec = read("wire-deck");
        WireSpecification deck = spec.wires().get("deck");
        Material polymer = spec.materials().get("polyurethane");
        double area = Math.PI / 4 * Math.pow(deck.section().outerDiameter(), 2);
        assertThat(deck.length()).isCloseTo(0.300, within(1e-6));
        assertThat(deck.tension() / area).isCloseTo(2.5e6, within(0.05e6));
        assertThat(deck.tension() / area / polymer.youngsModulus()).isCloseTo(0.042, within(0.0005));
        double firstMode = Math.sqrt(deck.tension() / (polymer.density() * area)) / (2 * deck.length());
        assertThat(firstMode).isCloseTo(77, within(0.5));
        MotionSpecification.Harmonic path =
                (MotionSpecification.Harmonic) spec.motions().get("throw").path();
        double acceleration = path.amplitude() * Math.pow(2 * Math.PI * path.frequency(), 2) / 9.81;
        assertThat(acceleration).isCloseTo(4.0, within(0.05));
        FeedSpecification.Stream feed = (FeedSpecification.Stream) spec.feeds().get("inlet");
        double perSecond = 0;
        for (String lot : feed.shares().keySet()) {
            double grain = 1280
                    * Math.PI
                    / 6
                    * Math.pow(spec.lots().get(lot).diameter().typical(), 3);
            perSecond += feed.shares().get(lot) * feed.massRate().orElseThrow() / grain;
        }
        assertThat(perSecond).isCloseTo(1150, within(20.0));
    }
}

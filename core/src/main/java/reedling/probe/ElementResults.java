// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import reedling.structure.Body;
import reedling.structure.ElementLaw;
import reedling.structure.ElementSet;
import reedling.structure.ResultColumn;
import reedling.structure.Structure;

/**
 * Axial force, bending moment and fibre stresses of all elements, numbered through in body order, as the last force pass
 * left them. Rigid bodies carry no element forces: their numbers are 0; a column that an element law does not report is
 * not a number. Threads: one, between steps.
 */
public final class ElementResults {

    private static final List<String> COLUMNS =
            List.of("axial_force", "bending_moment", "fibre_stress_max", "fibre_stress_min");

    private final Structure structure;
    private final List<Body> flexible = new ArrayList<>();
    private final List<int[]> placesOfSet = new ArrayList<>();
    private final double[][] values;
    private double[] rows = new double[0];

    public ElementResults(Structure structure) {
        this.structure = structure;
        int elements = structure.bodies().stream().mapToInt(Body::elementCount).sum();
        values = new double[COLUMNS.size()][elements];
        structure.bodies().stream().filter(body -> !body.rigid()).forEach(flexible::add);
        for (ElementSet set : structure.elementSets()) {
            List<String> names =
                    set.law.resultColumns().stream().map(ResultColumn::name).toList();
            placesOfSet.add(COLUMNS.stream().mapToInt(names::indexOf).toArray());
        }
    }

    /** Takes the numbers of the last force pass. */
    public void take() {
        for (int s = 0; s < structure.elementSets().size(); s++) {
            ElementSet set = structure.elementSets().get(s);
            ElementLaw law = set.law;
            int width = law.resultColumns().size();
            if (rows.length < width * set.count()) {
                rows = new double[width * set.count()];
            }
            law.results(set, 0, set.count(), rows);
            int first = flexible.get(s).firstElement();
            for (int column = 0; column < COLUMNS.size(); column++) {
                fill(values[column], first, set.count(), placesOfSet.get(s)[column], width);
            }
        }
    }

    private void fill(double[] column, int first, int count, int place, int width) {
        if (place < 0) {
            Arrays.fill(column, first, first + count, Double.NaN);
            return;
        }
        for (int e = 0; e < count; e++) {
            column[first + e] = rows[e * width + place];
        }
    }

    /** Number of elements. */
    public int count() {
        return values[0].length;
    }

    /** Axial force of each element, N. */
    public double[] axialForce() {
        return values[0];
    }

    /** Larger bending moment of each element's ends, N m. */
    public double[] bendingMoment() {
        return values[1];
    }

    /** Largest fibre stress of each element, Pa. */
    public double[] fibreStress() {
        return values[2];
    }

    /** Smallest fibre stress of each element, Pa. */
    public double[] smallestFibreStress() {
        return values[3];
    }
}

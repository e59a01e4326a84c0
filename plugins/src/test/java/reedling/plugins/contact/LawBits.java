// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.HashMap;
import java.util.Map;
import java.util.Random;
import java.util.ServiceLoader;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.HistoryColumn;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;

/** Runs every contact law found over blocks of random rows and prints a digest of all it wrote; a program of its own. */
final class LawBits {

    private static final int ROWS = 64;
    private static final int STEPS = 50;

    private final Random random = new Random(20_250_101);
    private final ContactBlock block = new ContactBlock();
    private long digest = 1;

    private LawBits() {}

    /** One line a law and set of parameters: name, smallest or default parameters, digest. */
    public static void main(String[] arguments) {
        for (ContactLawProvider provider : ServiceLoader.load(ContactLawProvider.class)) {
            for (boolean largest : new boolean[] {false, true}) {
                Map<String, Double> given = new HashMap<>();
                for (Parameter parameter : provider.parameters()) {
                    if (parameter.obligatory() || largest && parameter.maximum() == 1) {
                        given.put(parameter.name(), parameter.maximum());
                    }
                }
                ContactLaw law = provider.create(ParameterValues.of(provider, given));
                System.out.println(provider.name() + " " + given + " " + Long.toHexString(new LawBits().run(law)));
            }
        }
    }

    private long run(ContactLaw law) {
        int columns = 1;
        for (HistoryColumn column : law.history()) {
            columns += column.components();
        }
        double[] history = new double[ROWS * columns];
        Material grain = new Material("grain", 2500, 1e8, 0.3);
        MaterialPair pair = new MaterialPair(grain, grain, 0.4, 0.5, 0.05);
        ContactKernel kernel = law.bind(pair, ContactKind.GRAIN_GRAIN, 1);
        for (int step = 0; step < STEPS; step++) {
            block.open(ROWS, 1e-5 * random.nextDouble(), history, 0, columns, step % 2 == 0);
            fill();
            kernel.apply(block);
            mix(Double.doubleToRawLongBits(block.shortestDuration()));
            for (int column = 0; column < Column.COUNT; column++) {
                for (int r = 0; r < ROWS; r++) {
                    mix(Double.doubleToRawLongBits(block.columns()[ContactBlock.at(column) + r]));
                }
            }
            for (double value : history) {
                mix(Double.doubleToRawLongBits(value));
            }
        }
        return digest;
    }

    private void mix(long bits) {
        digest = 31 * digest + bits;
        digest ^= digest >>> 29;
    }

    /** Rows of all sorts: deep, shallow and apart, pushing and sliding hard and hardly. */
    private void fill() {
        for (int column = 0; column < Column.COUNT; column++) {
            for (int r = 0; r < ROWS; r++) {
                set(column, r, random.nextDouble() - 0.3);
            }
        }
        for (int r = 0; r < ROWS; r++) {
            double overlap = random.nextInt(5) == 0 ? -1e-5 : 1e-5 * random.nextDouble();
            set(Column.OVERLAP, r, overlap);
            set(Column.TOUCH, r, overlap > 0 ? 1 : 0);
            set(Column.EFFECTIVE_RADIUS, r, 1e-3 * (1 + random.nextDouble()));
            set(Column.EFFECTIVE_MASS, r, 1e-5 * (1 + random.nextDouble()));
            set(Column.INVERSE_MASS, r, 1e5 * (1 + random.nextDouble()));
            set(Column.INVERSE_MASS_SLIDING, r, 3e5 * (1 + random.nextDouble()));
            set(Column.INVERSE_INERTIA, r, 1e11 * (1 + random.nextDouble()));
            set(Column.DAMPING, r, random.nextDouble());
            set(Column.STIFFNESS, r, 1e4 * (1 + random.nextDouble()));
            set(Column.CONTACT_RADIUS, r, 1e-4 * (1 + random.nextDouble()));
            set(Column.NORMAL_FORCE, r, Math.max(0, random.nextDouble() - 0.2));
            set(Column.RADIUS_RATIO, r, random.nextInt(10) == 0 ? 0 : 2 * random.nextDouble());
            direct(Column.NORMAL, r);
            direct(Column.MEAN_NORMAL, r);
        }
    }

    private void direct(int column, int row) {
        double x = random.nextGaussian();
        double y = random.nextGaussian();
        double z = random.nextGaussian();
        double length = Math.sqrt(x * x + y * y + z * z);
        set(column, row, x / length);
        set(column + 1, row, y / length);
        set(column + 2, row, z / length);
    }

    private void set(int column, int row, double value) {
        block.columns()[ContactBlock.at(column) + row] = value;
    }
}

// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.conform;

import static reedling.contact.ContactBlock.at;

import java.util.List;
import java.util.Map;
import java.util.function.BiFunction;
import java.util.function.Function;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.HistoryColumn;
import reedling.contact.Stage;
import reedling.material.MaterialPair;
import reedling.plugin.ParameterValues;
import reedling.plugins.contact.HertzProvider;
import reedling.plugins.contact.MindlinProvider;

/** Built-in laws with one thing broken in each. */
final class BrokenLaws {

    private static final ParameterValues NONE = ParameterValues.of(new HertzProvider(), Map.of());

    private BrokenLaws() {}

    /** What a broken law does to a block after the sound kernel. */
    interface Damage {
        void apply(ContactBlock block);
    }

    /** What a broken law multiplies the elastic force of a row by. */
    interface Factor {
        double of(double[] columns, int row);
    }

    private record Provided(String name, Stage stage, Function<ParameterValues, ContactLaw> maker)
            implements ContactLawProvider {
        @Override
        public int apiLevel() {
            return API_LEVEL;
        }

        @Override
        public String summary() {
            return "Broken on purpose.";
        }

        @Override
        public String source() {
            return "common practice, no source";
        }

        @Override
        public ContactLaw create(ParameterValues values) {
            return maker.apply(values);
        }
    }

    private record Law(ContactLaw sound, List<HistoryColumn> history, Function<ContactKernel, ContactKernel> breaks)
            implements ContactLaw {
        @Override
        public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
            return breaks.apply(sound.bind(pair, kind, historyColumn));
        }
    }

    private record Damaged(ContactKernel sound, Damage damage, double slowness) implements ContactKernel {
        @Override
        public void apply(ContactBlock block) {
            sound.apply(block);
            damage.apply(block);
        }

        @Override
        public double duration(double speed, double radius, double mass) {
            return slowness * sound.duration(speed, radius, mass);
        }

        @Override
        public double dampingRatio() {
            return sound.dampingRatio();
        }
    }

    /** A normal law with damage done to its blocks; it declares the sound duration times a slowness. */
    static ContactLawProvider normal(Damage damage, double slowness) {
        ContactLaw sound = new HertzProvider().create(NONE);
        return new Provided(
                "broken",
                Stage.NORMAL,
                values -> new Law(sound, sound.history(), kernel -> new Damaged(kernel, damage, slowness)));
    }

    static ContactLawProvider scaled(Factor factor) {
        return normal(
                block -> {
                    double[] c = block.columns();
                    for (int r = 0; r < block.rows(); r++) {
                        c[at(Column.ELASTIC_FORCE) + r] *= factor.of(c, r);
                    }
                },
                1);
    }

    /** Friction with other history columns declared, and damage that knows its first history column. */
    static ContactLawProvider friction(List<HistoryColumn> declared, BiFunction<ContactBlock, Integer, Void> damage) {
        ContactLaw sound = new MindlinProvider().create(NONE);
        return new Provided("broken", Stage.TANGENTIAL, values -> new ContactLaw() {
            @Override
            public List<HistoryColumn> history() {
                return declared;
            }

            @Override
            public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
                return new Damaged(
                        sound.bind(pair, kind, historyColumn), block -> damage.apply(block, historyColumn), 1);
            }
        });
    }

    static double column(double[] columns, int column, int row) {
        return columns[at(column) + row];
    }
}

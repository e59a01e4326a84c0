// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import static org.assertj.core.api.Assertions.assertThat;

import java.lang.reflect.Method;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

class PerContactKernelTest {

    private static final double FORCE = 3;

    private record Push() implements PerContactLaw {
        @Override
        public void contact(ContactRow row) {
            row.elasticForce(FORCE);
            row.contactRadius(1);
            row.history(1, row.history(1) + row.overlap());
        }
    }

    private static ContactBlock block(double[] history) {
        ContactBlock block = new ContactBlock();
        block.open(8, 1e-6, history, 0, 4, false);
        Arrays.fill(block.columns(), Double.NaN);
        for (int r = 0; r < 8; r++) {
            block.columns()[ContactBlock.at(Column.TOUCH) + r] = r % 2;
            block.columns()[ContactBlock.at(Column.OVERLAP) + r] = 10 + r;
        }
        return block;
    }

    @Test
    void touchingRowsAreGivenToTheLawAndTheOthersStandAtZero() {
        double[] history = new double[32];
        Arrays.fill(history, 100);
        ContactBlock block = block(history);
        new Push().asKernel(Stage.NORMAL, 1, 2).apply(block);
        for (int r = 0; r < 8; r++) {
            boolean touches = r % 2 == 1;
            double[] c = block.columns();
            assertThat(c[ContactBlock.at(Column.ELASTIC_FORCE) + r]).isEqualTo(touches ? FORCE : 0);
            assertThat(c[ContactBlock.at(Column.STIFFNESS) + r]).isZero();
            assertThat(c[ContactBlock.at(Column.CONTACT_RADIUS) + r]).isPositive();
            // columns 1 and 2 are the law's, its own second is column 2
            assertThat(history[block.historyAtRow(r, 0)]).isEqualTo(100);
            assertThat(history[block.historyAtRow(r, 1)]).isEqualTo(touches ? 100 : 0);
            assertThat(history[block.historyAtRow(r, 2)]).isEqualTo(touches ? 110 + r : 0);
            assertThat(history[block.historyAtRow(r, 3)]).isEqualTo(100);
        }
    }

    /** Whatever the engine asks of a kernel, a law for one contact can answer: a new question must be passed on too. */
    @Test
    void everyQuestionToAKernelIsPassedOn() {
        List<String> answered = Arrays.stream(PerContactKernel.class.getDeclaredMethods())
                .map(Method::getName)
                .toList();
        assertThat(ContactKernel.class.getMethods())
                .filteredOn(Method::isDefault)
                .extracting(Method::getName)
                .isNotEmpty()
                .allSatisfy(name -> assertThat(answered).contains(name));
    }
}

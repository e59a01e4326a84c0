// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import reedling.structure.NodalLoads;
import reedling.structure.Structure;
import reedling.structure.WireDamping;

/** Same bits for any order of tasks and after being saved and read back. */
class StructureStateTest {

    private static final WireDamping DAMPED = new WireDamping(0, 0.05, 0.05);
    private static final double STEP = 1e-5;

    private static byte[] bytes(Structure structure) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        structure.write(new DataOutputStream(bytes));
        return bytes.toByteArray();
    }

    private static void run(Structure structure, int from, int to, boolean parallel) {
        for (int n = from; n < to; n++) {
            double old = n == 0 ? 0 : STEP;
            tasks(structure.elementTasks(), parallel).forEach(task -> structure.elementForces(task, old));
            structure.poseSupports((n + 1) * STEP, STEP);
            tasks(structure.nodeTasks(), parallel)
                    .forEach(task -> structure.moveNodes(task, old, STEP, NodalLoads.NONE));
        }
    }

    private static IntStream tasks(int count, boolean parallel) {
        IntStream forward = IntStream.range(0, count);
        return parallel ? forward.map(i -> count - 1 - i).parallel() : forward;
    }

    @Test
    void taskOrderAndThreadsDoNotChangeABit() throws IOException {
        Structure one = Deck.shaken(5, DAMPED);
        Structure many = Deck.shaken(5, DAMPED);
        assertThat(one.elementTasks()).isEqualTo(5);
        assertThat(one.nodeTasks()).isEqualTo(5);
        run(one, 0, 500, false);
        run(many, 0, 500, true);
        assertThat(bytes(many)).isEqualTo(bytes(one));
        assertThat(many.energy(many.strainEnergy())).isEqualTo(one.energy(one.strainEnergy()));
    }

    @Test
    void resumedStructureHasTheSameBits() throws IOException {
        Structure whole = Deck.shaken(2, DAMPED);
        run(whole, 0, 100, false);
        byte[] saved = bytes(whole);
        run(whole, 100, 200, false);
        Structure resumed = Deck.shaken(2, DAMPED);
        resumed.read(new DataInputStream(new ByteArrayInputStream(saved)));
        run(resumed, 100, 200, false);
        assertThat(bytes(resumed)).isEqualTo(bytes(whole));
    }

    @Test
    void stateOfAnotherMeshIsRefused() throws IOException {
        byte[] saved = bytes(Deck.shaken(1, DAMPED));
        assertThatThrownBy(() -> Deck.shaken(2, DAMPED).read(new DataInputStream(new ByteArrayInputStream(saved))))
                .isInstanceOf(IOException.class)
                .hasMessageContaining("another mesh");
    }
}

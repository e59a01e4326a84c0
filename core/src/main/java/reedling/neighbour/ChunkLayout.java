// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

/**
 * Cuts the grains, in memory order, into chunks of equal count. Chunks are the unit of parallel work and of ordered
 * sums; their number depends on the number of grains only, never on the number of threads.
 *
 * @param grains number of grains
 * @param size grains a chunk, the last may hold fewer
 */
public record ChunkLayout(int grains, int size) {

    private static final int SMALLEST =
            160; // grains: below, tiles that are not full cost more than a second core gives
    private static final int LARGEST = 1000; // grains: so that every core of a large server has several chunks
    private static final int WANTED = 8; // chunks in a small case

    /** Layout for so many grains. */
    public static ChunkLayout of(int grains) {
        int size = Math.clamp((grains + WANTED - 1) / WANTED, SMALLEST, LARGEST);
        return new ChunkLayout(grains, size);
    }

    public int count() {
        return Math.max(1, (grains + size - 1) / size);
    }

    public int from(int chunk) {
        return Math.min(grains, chunk * size);
    }

    public int to(int chunk) {
        return Math.min(grains, (chunk + 1) * size);
    }

    public int chunkOf(int grain) {
        return grain / size;
    }
}

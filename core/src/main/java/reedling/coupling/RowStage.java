// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

/**
 * One stage of the work on a block of contact rows. Stages are called from one place, through this interface, so that
 * the compiler builds each for itself: a vector kernel that is inlined into a larger method passes the compiler's limit
 * on inlined code, and every vector becomes an object on the heap (measured: twenty times slower).
 */
interface RowStage {

    void run(RowRange rows);
}

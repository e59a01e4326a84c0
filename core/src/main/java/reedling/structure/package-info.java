// SPDX-License-Identifier: Apache-2.0
/**
 * Parts that bend: nodes, elements and their supports, advanced by kick-drift-kick.
 *
 * <p>Every node carries a position, an orientation and one scalar rotary inertia, so lines and surfaces can share nodes
 * and the rotation update needs no gyroscopic term.
 */
@NullMarked
package reedling.structure;

import org.jspecify.annotations.NullMarked;

// SPDX-License-Identifier: Apache-2.0
/** Dimensions, and quantities written as text; units exist only at the edge, everything inside is SI. */
@NullMarked
package reedling.unit;

import org.jspecify.annotations.NullMarked;

// SPDX-License-Identifier: Apache-2.0
/** Physical dimensions, and quantities written as text; kernels below the edge hold SI doubles only. */
@NullMarked
package reedling.unit;

import org.jspecify.annotations.NullMarked;

// SPDX-License-Identifier: Apache-2.0
/** Choice of the step. */
@NullMarked
package reedling.time;

import org.jspecify.annotations.NullMarked;

// SPDX-License-Identifier: Apache-2.0
/** Energy balance and the guard that stops a run whose state means nothing. */
@NullMarked
package reedling.check;

import org.jspecify.annotations.NullMarked;

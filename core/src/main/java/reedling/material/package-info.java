// SPDX-License-Identifier: Apache-2.0
/** Materials, and what two of them do to each other. */
@NullMarked
package reedling.material;

import org.jspecify.annotations.NullMarked;

// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.math;

import org.jspecify.annotations.NullMarked;

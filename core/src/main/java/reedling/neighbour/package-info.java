// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.neighbour;

import org.jspecify.annotations.NullMarked;

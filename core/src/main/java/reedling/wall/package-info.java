// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.wall;

import org.jspecify.annotations.NullMarked;

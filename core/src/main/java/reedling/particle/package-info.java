// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.particle;

import org.jspecify.annotations.NullMarked;

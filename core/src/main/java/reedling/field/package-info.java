// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.field;

import org.jspecify.annotations.NullMarked;

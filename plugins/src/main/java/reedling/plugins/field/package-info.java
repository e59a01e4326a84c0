// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.plugins.field;

import org.jspecify.annotations.NullMarked;

// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.plugins.element;

import org.jspecify.annotations.NullMarked;

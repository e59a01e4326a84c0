// SPDX-License-Identifier: Apache-2.0
@NullMarked
package reedling.contact;

import org.jspecify.annotations.NullMarked;

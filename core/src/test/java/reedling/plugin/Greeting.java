// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

/** A service interface for the loader's tests. */
public interface Greeting extends Provider {

    String greet();
}

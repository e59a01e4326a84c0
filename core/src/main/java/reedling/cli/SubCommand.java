// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

/** A command that another module brings; annotated as a picocli command and found by {@link java.util.ServiceLoader}. */
public interface SubCommand {}

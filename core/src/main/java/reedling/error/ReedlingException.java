// SPDX-License-Identifier: Apache-2.0
package reedling.error;

import java.util.List;
import java.util.stream.Collectors;

/** A failure that its user can act on: printed as its findings, one a line, without a stack trace. */
public final class ReedlingException extends RuntimeException {

    private final transient List<Finding> findings;
    private final ExitCode exitCode;

    public ReedlingException(ExitCode exitCode, List<Finding> findings) {
        super(findings.stream().map(Finding::toString).collect(Collectors.joining(System.lineSeparator())));
        this.exitCode = exitCode;
        this.findings = List.copyOf(findings);
    }

    public ReedlingException(ExitCode exitCode, Finding finding) {
        this(exitCode, List.of(finding));
    }

    public ReedlingException(ExitCode exitCode, Finding finding, Throwable cause) {
        this(exitCode, List.of(finding));
        initCause(cause);
    }

    public ExitCode exitCode() {
        return exitCode;
    }

    public List<Finding> findings() {
        return findings;
    }
}

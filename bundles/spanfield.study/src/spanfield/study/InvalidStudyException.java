/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

import java.util.List;
import spanfield.model.validation.Finding;
import spanfield.study.internal.Messages;

/** A study with errors, of which nothing is computed. Carries everything that the checks found. */
public final class InvalidStudyException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final transient List<Finding> findings;

    /** @param findings all findings, at least one of them an error */
    public InvalidStudyException(List<Finding> findings) {
        super(message(findings));
        this.findings = List.copyOf(findings);
    }

    private static String message(List<Finding> findings) {
        List<Finding> errors = findings.stream().filter(Finding::isError).toList();
        Finding first = errors.get(0);
        return errors.size() == 1 ? Messages.text("invalid.one", first.place(), first.message())
            : Messages.text("invalid", errors.size(), first.place(), first.message());
    }

    /** All findings, errors first. */
    public List<Finding> findings() {
        return findings;
    }
}

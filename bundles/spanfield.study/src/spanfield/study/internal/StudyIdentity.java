/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.List;
import spanfield.study.result.Notice;

/**
 * What a result says about the study it came from.
 *
 * @param digest   SHA-256 of the study as saved, lower-case hexadecimal
 * @param findings warnings and information of the checks, as notices
 * @param changes  what a request changed about the study as saved, in whole sentences
 */
public record StudyIdentity(String digest, List<Notice> findings, List<String> changes) {

    public StudyIdentity {
        findings = List.copyOf(findings);
        changes = List.copyOf(changes);
    }
}

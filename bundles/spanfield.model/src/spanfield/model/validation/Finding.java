/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.validation;

import java.util.Objects;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

/**
 * Something that validation has found.
 *
 * @param severity how much it matters
 * @param rule     stable name of the rule, says what should hold, e.g. Circuit_PhasesOnDifferentAttachments
 * @param message  what is wrong and what to do, for the user
 * @param place    where, for the user: names from the study down to the object
 * @param object   the object, for programs; null when the finding has none
 * @param feature  the feature of the object, or null
 */
public record Finding(Severity severity, String rule, String message, String place, EObject object, EStructuralFeature feature) {

    public Finding {
        Objects.requireNonNull(severity);
        Objects.requireNonNull(rule);
        Objects.requireNonNull(message);
        Objects.requireNonNull(place);
    }

    /** Whether the finding keeps the study from being computed. */
    public boolean isError() {
        return severity == Severity.ERROR;
    }

    @Override
    public String toString() {
        return severity + " " + place + ": " + message + " [" + rule + "]";
    }
}

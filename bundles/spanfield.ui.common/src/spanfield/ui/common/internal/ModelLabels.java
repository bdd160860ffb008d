/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common.internal;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.viewers.LabelProvider;
import spanfield.model.Study;
import spanfield.model.validation.Places;

/** Labels of model objects: kind and name, as in findings, so that the user meets one wording everywhere. */
public final class ModelLabels extends LabelProvider {

    @Override
    public String getText(Object element) {
        if (element instanceof Study study) {
            return study.getName() == null ? "Study" : study.getName();
        }
        if (element instanceof EObject object) {
            String name = Places.name(object);
            return Character.toUpperCase(name.charAt(0)) + name.substring(1);
        }
        return String.valueOf(element);
    }
}

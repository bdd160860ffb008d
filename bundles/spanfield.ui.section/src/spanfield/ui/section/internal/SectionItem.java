/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.List;
import org.eclipse.emf.ecore.EObject;

/**
 * Something that the cross-section shows. Identified by its kind and the model object behind it, so that a selection survives a refresh.
 *
 * @param kind      what it is
 * @param target    model object that is selected and changed, or null
 * @param label     text beside it, or empty
 * @param places    points in metres: offset and elevation of each
 * @param group     number of its circuit, for the colour; -1 without one
 * @param draggable whether it can be moved
 */
record SectionItem(Kind kind, EObject target, String label, List<double[]> places, int group, boolean draggable) {

    /** What there is to show. */
    enum Kind {
        /** Ground line. */
        GROUND,
        /** Line at the height of the field points. */
        REFERENCE,
        /** Left edge of the right-of-way. */
        LEFT_EDGE,
        /** Right edge of the right-of-way. */
        RIGHT_EDGE,
        /** Outline of a structure. */
        STRUCTURE,
        /** Phase at the station. */
        PHASE,
        /** Shield wire at the station. */
        SHIELD
    }

    boolean sameAs(SectionItem other) {
        return kind == other.kind && target == other.target && label.equals(other.label);
    }
}

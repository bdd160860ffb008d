/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import spanfield.model.Attachment;
import spanfield.model.EdgePoint;
import spanfield.model.Line;
import spanfield.model.Phase;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldPackage;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.validation.Places;
import spanfield.ui.section.internal.SectionItem.Kind;

/** What moving an item of the cross-section means for the model: numbers of attributes that change. */
final class SectionMoves {

    private static final SpanfieldPackage P = SpanfieldPackage.eINSTANCE;

    private SectionMoves() {
    }

    /** One number that changes. */
    record Change(EObject object, EAttribute attribute, double value) {
    }

    /**
     * The changes that a move makes.
     *
     * <p>A wire takes its attachment along, in every structure type of its line; a structure takes its whole line along; an edge moves
     * its edge point.
     *
     * @param across metres to the right
     * @param up     metres up; ignored for structures and edges
     * @param step   values are rounded to this, in metres; 0 leaves them as they are
     */
    static List<Change> changes(SectionItem item, double across, double up, double step) {
        List<Change> changes = new ArrayList<>();
        switch (item.kind()) {
            case PHASE -> {
                Phase phase = (Phase) item.target();
                moveAttachment((Line) phase.eContainer().eContainer(), phase.getAttachment(), across, up, step, changes);
            }
            case SHIELD -> {
                ShieldWire wire = (ShieldWire) item.target();
                moveAttachment((Line) wire.eContainer(), wire.getAttachment(), across, up, step, changes);
            }
            case STRUCTURE -> {
                Line line = (Line) item.target().eContainer();
                double shift = round(across, step);
                for (Structure structure : line.getStructures()) {
                    changes.add(new Change(structure, P.getStructure_OffsetMetres(), structure.getOffsetMetres() + shift));
                }
            }
            case LEFT_EDGE -> {
                EdgePoint edge = (EdgePoint) item.target();
                changes.add(new Change(edge, P.getEdgePoint_LeftOffsetMetres(), round(edge.getLeftOffsetMetres() + across, step)));
            }
            case RIGHT_EDGE -> {
                EdgePoint edge = (EdgePoint) item.target();
                changes.add(new Change(edge, P.getEdgePoint_RightOffsetMetres(), round(edge.getRightOffsetMetres() + across, step)));
            }
            default -> { }
        }
        return changes;
    }

    private static void moveAttachment(Line line, String name, double across, double up, double step, List<Change> changes) {
        Set<StructureType> types = new LinkedHashSet<>();
        line.getStructures().forEach(structure -> types.add(structure.getType()));
        for (StructureType type : types) {
            for (Attachment attachment : type.getAttachments()) {
                if (name.equals(attachment.getName())) {
                    changes.add(new Change(attachment, P.getAttachment_OffsetMetres(), round(attachment.getOffsetMetres() + across, step)));
                    changes.add(new Change(attachment, P.getAttachment_HeightMetres(), Math.max(attachment.getInsulatorLengthMetres() + 0.1,
                        round(attachment.getHeightMetres() + up, step))));
                }
            }
        }
    }

    static double round(double value, double step) {
        // two steps of rounding: to the step, and away from the binary tail that the first leaves
        return step > 0 ? Math.rint(Math.rint(value / step) * step * 1e9) / 1e9 : value;
    }

    /** Name of a move for the Edit menu. */
    static String label(SectionItem item) {
        return item.kind() == Kind.STRUCTURE ? "Move " + Places.name(item.target().eContainer())
            : item.kind() == Kind.LEFT_EDGE ? "Move left edge" : item.kind() == Kind.RIGHT_EDGE ? "Move right edge" : "Move " + Places.name(item.target());
    }
}

/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import org.eclipse.draw2d.geometry.Point;
import org.eclipse.gef.commands.Command;
import org.eclipse.gef.editpolicies.NonResizableEditPolicy;
import org.eclipse.gef.requests.ChangeBoundsRequest;

/** Turns a drag of an item into changes of the model: one undoable command at the end, and previews of the field on the way. */
final class MovePolicy extends NonResizableEditPolicy {

    private final ItemPart part;

    MovePolicy(ItemPart part) {
        this.part = part;
    }

    /** Key in the data of a request: whether the move is not to be rounded. */
    static final String FREE = "spanfield.free";

    private static boolean free(ChangeBoundsRequest request) {
        return Boolean.TRUE.equals(request.getExtendedData().get(FREE));
    }

    @Override
    protected Command getMoveCommand(ChangeBoundsRequest request) {
        Point delta = request.getMoveDelta();
        boolean free = free(request);
        SectionContext context = part.context();
        SectionItem item = part.item();
        return new Command(SectionMoves.label(item)) {
            @Override
            public boolean canExecute() {
                return item.draggable();
            }

            @Override
            public void execute() {
                context.move(item, delta, free);
            }
        };
    }

    @Override
    protected void showChangeBoundsFeedback(ChangeBoundsRequest request) {
        super.showChangeBoundsFeedback(request);
        part.context().preview(part.item(), request.getMoveDelta(), free(request));
    }

    @Override
    protected void eraseChangeBoundsFeedback(ChangeBoundsRequest request) {
        super.eraseChangeBoundsFeedback(request);
        part.context().endPreview();
    }
}

/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.List;
import org.eclipse.draw2d.FreeformLayer;
import org.eclipse.draw2d.IFigure;
import org.eclipse.draw2d.MarginBorder;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.EditPolicy;
import org.eclipse.gef.Request;
import org.eclipse.gef.commands.Command;
import org.eclipse.gef.editparts.AbstractGraphicalEditPart;
import org.eclipse.gef.editpolicies.ContainerEditPolicy;
import org.eclipse.gef.requests.CreateRequest;

/** The sheet on which the items lie. Figures place themselves. */
final class ContentsPart extends AbstractGraphicalEditPart {

    private final SectionContext context;

    ContentsPart(SectionContext context) {
        this.context = context;
        setModel(context);
    }

    @Override
    protected IFigure createFigure() {
        FreeformLayer layer = new FreeformLayer();
        layer.setLayoutManager(null);
        layer.setBorder(new MarginBorder(10));
        layer.setForegroundColor(context.foreground());
        return layer;
    }

    @Override
    protected void createEditPolicies() {
        // the items are moved by policies of their own; the sheet takes what the palette places
        installEditPolicy(EditPolicy.CONTAINER_ROLE, new ContainerEditPolicy() {
            @Override
            protected Command getCreateCommand(CreateRequest request) {
                Point place = request.getLocation().getCopy();
                getFigure().translateToRelative(place);
                return new Command("Place") {
                    @Override
                    public void execute() {
                        context.place((SectionPalette.Kind) request.getNewObjectType(), place);
                    }
                };
            }
        });
    }

    @Override
    protected List<?> getModelChildren() {
        return context.items();
    }

    /** Every drag stays on this sheet: it is a move, not a change of parents. */
    @Override
    public EditPart getTargetEditPart(Request request) {
        return this;
    }
}

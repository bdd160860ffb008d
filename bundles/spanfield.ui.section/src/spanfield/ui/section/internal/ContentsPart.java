/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.List;
import org.eclipse.draw2d.FreeformLayer;
import org.eclipse.draw2d.IFigure;
import org.eclipse.draw2d.MarginBorder;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.Request;
import org.eclipse.gef.editparts.AbstractGraphicalEditPart;

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
        // the items are moved by policies of their own
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

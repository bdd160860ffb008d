/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.draw2d.IFigure;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.draw2d.geometry.PointList;
import org.eclipse.draw2d.geometry.Rectangle;
import org.eclipse.gef.DragTracker;
import org.eclipse.gef.EditPolicy;
import org.eclipse.gef.Request;
import org.eclipse.gef.RequestConstants;
import org.eclipse.gef.editparts.AbstractGraphicalEditPart;
import org.eclipse.gef.tools.DragEditPartsTracker;
import org.eclipse.swt.SWT;

/** The part of one item: chooses a figure for its kind and places it by the scale of the section. */
final class ItemPart extends AbstractGraphicalEditPart {

    private static final int EARTH_DEPTH = 400;

    private final SectionContext context;

    ItemPart(SectionItem item, SectionContext context) {
        this.context = context;
        setModel(item);
    }

    SectionItem item() {
        return (SectionItem) getModel();
    }

    SectionContext context() {
        return context;
    }

    @Override
    protected IFigure createFigure() {
        SectionItem item = item();
        return switch (item.kind()) {
            case GROUND -> new PolylinesFigure(context.groundColor(), SWT.LINE_SOLID, EARTH_DEPTH);
            case REFERENCE -> new PolylinesFigure(context.faintColor(), SWT.LINE_DASH, 0);
            case STRUCTURE -> new PolylinesFigure(context.structureColor(), SWT.LINE_SOLID, 0);
            case LEFT_EDGE, RIGHT_EDGE -> new EdgeFigure(item.label(), item.kind() == SectionItem.Kind.LEFT_EDGE);
            case PHASE -> new WireFigure(item.label(), false, context.circuitColor(item.group()));
            case SHIELD -> new WireFigure("", true, context.structureColor());
        };
    }

    @Override
    protected void createEditPolicies() {
        if (item().draggable()) {
            installEditPolicy(EditPolicy.PRIMARY_DRAG_ROLE, new MovePolicy(this));
        }
    }

    @Override
    protected void refreshVisuals() {
        SectionScale scale = context.scale();
        SectionItem item = item();
        Point first = scale.toPixel(item.places().get(0)[0], item.places().get(0)[1]);
        switch (item.kind()) {
            case GROUND, REFERENCE, STRUCTURE -> ((PolylinesFigure) getFigure()).setLines(lines(item, scale));
            case LEFT_EDGE -> getFigure().setBounds(new Rectangle(first.x - EdgeFigure.WIDTH + 7, first.y - EdgeFigure.HEIGHT, EdgeFigure.WIDTH, EdgeFigure.HEIGHT));
            case RIGHT_EDGE -> getFigure().setBounds(new Rectangle(first.x - 6, first.y - EdgeFigure.HEIGHT, EdgeFigure.WIDTH, EdgeFigure.HEIGHT));
            case PHASE, SHIELD -> ((WireFigure) getFigure()).setPlace(first);
        }
    }

    /** A third number of 1 begins a new line. */
    private static List<PointList> lines(SectionItem item, SectionScale scale) {
        List<PointList> lines = new ArrayList<>();
        for (double[] place : item.places()) {
            if (lines.isEmpty() || place.length > 2 && place[2] == 1) {
                lines.add(new PointList());
            }
            lines.get(lines.size() - 1).addPoint(scale.toPixel(place[0], place[1]));
        }
        return lines;
    }

    /** Takes the item in its new state; figure and selection stay. */
    void update(SectionItem fresh) {
        setModel(fresh);
        refreshVisuals();
    }

    @Override
    public boolean isSelectable() {
        return item().kind() != SectionItem.Kind.REFERENCE && item().kind() != SectionItem.Kind.GROUND;
    }

    @Override
    public DragTracker getDragTracker(Request request) {
        return new FreeTracker(this);
    }

    @Override
    public void performRequest(Request request) {
        if (RequestConstants.REQ_OPEN.equals(request.getType())) {
            context.open(item());
        }
    }

    /** Tells the request whether the key is held that leaves moves unrounded. */
    private static final class FreeTracker extends DragEditPartsTracker {

        FreeTracker(ItemPart part) {
            super(part);
        }

        @Override
        @SuppressWarnings("unchecked")
        protected void updateTargetRequest() {
            super.updateTargetRequest();
            getTargetRequest().getExtendedData().put(MovePolicy.FREE, getCurrentInput().isAltKeyDown());
        }
    }
}

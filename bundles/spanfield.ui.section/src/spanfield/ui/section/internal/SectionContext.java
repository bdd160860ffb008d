/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.List;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.swt.graphics.Color;

/** What the parts of the cross-section need from their page: the items, the scale, colours of the theme, and what a drag means. */
interface SectionContext {

    List<SectionItem> items();

    SectionScale scale();

    Color foreground();

    Color faintColor();

    Color groundColor();

    Color structureColor();

    /** Colour of a circuit by its number. */
    Color circuitColor(int group);

    /** Moves an item by pixels, as a command; a free move is not rounded. */
    void move(SectionItem item, Point delta, boolean free);

    /** Places something new, as a command. */
    void place(SectionPalette.Kind kind, Point place);

    /** Computes what a move would give, without changing the study. */
    void preview(SectionItem item, Point delta, boolean free);

    /** Shows the numbers of an item where they are typed. */
    void open(SectionItem item);

    /** The drag is over, or was given up. */
    void endPreview();
}

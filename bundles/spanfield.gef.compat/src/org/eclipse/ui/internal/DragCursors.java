/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package org.eclipse.ui.internal;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Cursor;
import org.eclipse.swt.widgets.Display;

/**
 * Cursors for docking feedback under the internal name by which the flyout palette of GEF 3.2 calls them; the workbench no longer has
 * the class. System cursors serve: they need no disposal.
 */
public final class DragCursors {

    /** Codes as GEF passes them: 1 left, 2 right, 3 top, 4 bottom, 5 centre. */
    private static final int[] SYSTEM_CURSORS = {SWT.CURSOR_NO, SWT.CURSOR_SIZEW, SWT.CURSOR_SIZEE, SWT.CURSOR_SIZEN, SWT.CURSOR_SIZES, SWT.CURSOR_SIZEALL};

    private DragCursors() {
    }

    /** The system cursor for a docking code; an unknown code gets the "no" cursor. */
    public static Cursor getCursor(int code) {
        int index = code >= 0 && code < SYSTEM_CURSORS.length ? code : 0;
        return Display.getCurrent().getSystemCursor(SYSTEM_CURSORS[index]);
    }
}

/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app;

import org.eclipse.ui.IFolderLayout;
import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.IPerspectiveFactory;

/** Editor in the middle, the study as a tree with its properties on the right, findings and the start view below. */
public final class CorridorPerspective implements IPerspectiveFactory {

    static final String ID = "spanfield.app.corridor";

    @Override
    public void createInitialLayout(IPageLayout layout) {
        String editors = layout.getEditorArea();
        layout.setEditorAreaVisible(true);
        layout.addView(IPageLayout.ID_OUTLINE, IPageLayout.RIGHT, 0.74f, editors);
        layout.addView(IPageLayout.ID_PROP_SHEET, IPageLayout.BOTTOM, 0.5f, IPageLayout.ID_OUTLINE);
        IFolderLayout below = layout.createFolder("below", IPageLayout.BOTTOM, 0.74f, editors);
        below.addView(StartView.ID);
        below.addView("spanfield.ui.common.findings");
    }
}

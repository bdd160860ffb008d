/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.action.IToolBarManager;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;

/** A page of the study editor. Subclasses are contributed to the extension point spanfield.ui.common.pages and have a public constructor. */
public abstract class StudyPage {

    private StudyEditor editor;

    final void attach(StudyEditor owner) {
        editor = owner;
    }

    /** The editor that the page belongs to. */
    protected final StudyEditor editor() {
        return editor;
    }

    /** The document that the page shows. */
    protected final StudyDocument document() {
        return editor.document();
    }

    /** Creates the page's control. Called once. */
    public abstract Control createControl(Composite parent);

    /** Gives the focus to the part of the page that has most use of it. */
    public abstract void setFocus();

    /** The model has changed through the command stack. */
    public void modelChanged() {
        // a page that shows results only waits for them
    }

    /** The computation has news. */
    public void computed(StudyComputation.Outcome outcome) {
        // a page that shows the model only has no use of them
    }

    /**
     * Shows an object of the model.
     *
     * @return whether the page can show objects of that kind
     */
    public boolean reveal(EObject object) {
        return false;
    }

    /** Adds actions to the page's tool bar. */
    public void fillToolBar(IToolBarManager toolBar) {
        // none
    }

    /** Frees what the page holds. */
    public void dispose() {
        // nothing held
    }
}

/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common.internal;

import java.util.EventObject;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CommandStackListener;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.command.CommandParameter;
import org.eclipse.emf.edit.command.CreateChildCommand;
import org.eclipse.emf.edit.command.RemoveCommand;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.jface.viewers.ISelectionChangedListener;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.viewers.TreeViewer;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.views.contentoutline.ContentOutlinePage;
import spanfield.model.Study;
import spanfield.model.validation.Places;
import spanfield.ui.common.StudyEditor;

/** The study as a tree. The context menu adds children and removes objects, as commands. */
public final class StudyOutlinePage extends ContentOutlinePage {

    private final StudyEditor editor;
    private final CommandStackListener refresh = this::refresh;
    private final ISelectionChangedListener follow = event -> show(event.getSelection());
    private boolean showing;

    public StudyOutlinePage(StudyEditor editor) {
        this.editor = editor;
    }

    @Override
    public void createControl(Composite parent) {
        super.createControl(parent);
        TreeViewer viewer = getTreeViewer();
        viewer.setContentProvider(new ModelTree(editor.document().adapters()));
        viewer.setLabelProvider(new ModelLabels());
        viewer.setInput(new Object[] {editor.document().study()});
        viewer.expandToLevel(2);
        viewer.addSelectionChangedListener(event -> {
            if (!showing) {
                editor.select(event.getStructuredSelection().toArray());
            }
        });
        viewer.addDoubleClickListener(event -> {
            if (((IStructuredSelection) event.getSelection()).getFirstElement() instanceof EObject object) {
                editor.reveal(object);
            }
        });
        MenuManager menu = new MenuManager();
        menu.setRemoveAllWhenShown(true);
        menu.addMenuListener(this::fillMenu);
        viewer.getControl().setMenu(menu.createContextMenu(viewer.getControl()));
        editor.document().addListener(refresh);
        editor.selectionProvider().addSelectionChangedListener(follow);
    }

    private void refresh(EventObject event) {
        if (getControl() == null || getControl().isDisposed()) {
            return;
        }
        getControl().getDisplay().asyncExec(() -> {
            if (getControl() == null || getControl().isDisposed()) {
                return;
            }
            Object[] input = (Object[]) getTreeViewer().getInput();
            if (input[0] != editor.document().study()) {
                getTreeViewer().setInput(new Object[] {editor.document().study()});
                getTreeViewer().expandToLevel(2);
            } else {
                getTreeViewer().refresh();
            }
        });
    }

    private void show(org.eclipse.jface.viewers.ISelection selection) {
        if (getControl() == null || getControl().isDisposed() || selection.equals(getTreeViewer().getSelection())) {
            return;
        }
        showing = true;
        try {
            getTreeViewer().setSelection(selection, true);
        } finally {
            showing = false;
        }
    }

    private void fillMenu(IMenuManager menu) {
        if (!(getTreeViewer().getStructuredSelection().getFirstElement() instanceof EObject object)) {
            return;
        }
        MenuManager add = new MenuManager("Add");
        for (Object descriptor : editor.document().domain().getNewChildDescriptors(object, null)) {
            if (descriptor instanceof CommandParameter parameter && parameter.getEValue() != null) {
                Command command = CreateChildCommand.create(editor.document().domain(), object, parameter, java.util.List.of(object));
                if (command.canExecute()) {
                    String kind = Places.words(parameter.getEValue().eClass().getName());
                    String feature = Places.words(parameter.getEStructuralFeature().getName());
                    boolean named = feature.startsWith(kind) || kind.endsWith(feature);
                    add.add(action(named ? capital(kind) : capital(feature) + ": " + kind, command));
                }
            }
        }
        if (!add.isEmpty()) {
            menu.add(add);
        }
        if (!(object instanceof Study)) {
            menu.add(new Separator());
            menu.add(action("Remove " + Places.name(object), RemoveCommand.create(editor.document().domain(), object)));
        }
    }

    private static String capital(String text) {
        return Character.toUpperCase(text.charAt(0)) + text.substring(1);
    }

    private Action action(String text, Command command) {
        Action action = new Action(text) {
            @Override
            public void run() {
                editor.document().execute(command);
            }
        };
        action.setEnabled(command.canExecute());
        return action;
    }

    @Override
    public void dispose() {
        editor.document().removeListener(refresh);
        editor.selectionProvider().removeSelectionChangedListener(follow);
        super.dispose();
    }
}

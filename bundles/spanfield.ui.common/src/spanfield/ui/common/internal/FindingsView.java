/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common.internal;

import java.util.List;
import java.util.function.Consumer;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.jface.layout.TableColumnLayout;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.ColumnWeightData;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.IPartListener;
import org.eclipse.ui.ISharedImages;
import org.eclipse.ui.IWorkbenchPart;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.part.ViewPart;
import spanfield.model.validation.Finding;
import spanfield.model.validation.Severity;
import spanfield.ui.common.StudyComputation;
import spanfield.ui.common.StudyEditor;

/** Everything that the checks have found in the active study; a double click goes to the object, the context menu offers safe fixes. */
public final class FindingsView extends ViewPart {

    private final Consumer<StudyComputation.Outcome> results = outcome -> show(outcome.findings());
    private final IPartListener parts = new ActiveEditor();
    private TableViewer viewer;
    private StudyEditor editor;

    @Override
    public void createPartControl(Composite parent) {
        Composite holder = new Composite(parent, SWT.NONE);
        TableColumnLayout layout = new TableColumnLayout();
        holder.setLayout(layout);
        viewer = new TableViewer(holder, SWT.FULL_SELECTION | SWT.MULTI | SWT.V_SCROLL);
        viewer.getTable().setHeaderVisible(true);
        viewer.setContentProvider(ArrayContentProvider.getInstance());
        column(layout, "Kind", 10, finding -> switch (finding.severity()) {
            case ERROR -> "Error";
            case WARNING -> "Warning";
            case INFO -> "Note";
        }, true);
        column(layout, "Message", 60, Finding::message, false);
        column(layout, "Place", 30, Finding::place, false);
        viewer.addDoubleClickListener(event -> {
            if (((IStructuredSelection) event.getSelection()).getFirstElement() instanceof Finding finding && finding.object() != null && editor != null) {
                editor.reveal(finding.object());
            }
        });
        MenuManager menu = new MenuManager();
        menu.setRemoveAllWhenShown(true);
        menu.addMenuListener(this::fillMenu);
        viewer.getControl().setMenu(menu.createContextMenu(viewer.getControl()));
        getSite().getPage().addPartListener(parts);
        if (getSite().getPage().getActiveEditor() instanceof StudyEditor open) {
            follow(open);
        } else {
            show(List.of());
        }
    }

    private void fillMenu(IMenuManager menu) {
        if (!(viewer.getStructuredSelection().getFirstElement() instanceof Finding finding) || editor == null) {
            return;
        }
        if (finding.object() != null) {
            menu.add(action("Go to the object", () -> editor.reveal(finding.object())));
            menu.add(new Separator());
            QuickFixes.of(finding, editor.document()).forEach((text, command) -> menu.add(action(text, () -> editor.document().execute(command))));
        }
    }

    private static Action action(String text, Runnable run) {
        return new Action(text) {
            @Override
            public void run() {
                run.run();
            }
        };
    }

    private void column(TableColumnLayout layout, String title, int weight, java.util.function.Function<Finding, String> text, boolean image) {
        TableViewerColumn column = new TableViewerColumn(viewer, SWT.NONE);
        column.getColumn().setText(title);
        layout.setColumnData(column.getColumn(), new ColumnWeightData(weight, 60));
        column.setLabelProvider(new ColumnLabelProvider() {
            @Override
            public String getText(Object element) {
                return text.apply((Finding) element);
            }

            @Override
            public org.eclipse.swt.graphics.Image getImage(Object element) {
                if (!image) {
                    return null;
                }
                Severity severity = ((Finding) element).severity();
                return PlatformUI.getWorkbench().getSharedImages().getImage(severity == Severity.ERROR ? ISharedImages.IMG_OBJS_ERROR_TSK
                    : severity == Severity.WARNING ? ISharedImages.IMG_OBJS_WARN_TSK : ISharedImages.IMG_OBJS_INFO_TSK);
            }

            @Override
            public String getToolTipText(Object element) {
                return ((Finding) element).message();
            }
        });
    }

    private void follow(StudyEditor next) {
        if (editor == next) {
            return;
        }
        leave();
        editor = next;
        editor.computation().addListener(results);
        show(editor.computation().outcome().findings());
    }

    private void leave() {
        if (editor != null) {
            editor.computation().removeListener(results);
            editor = null;
        }
    }

    private void show(List<Finding> findings) {
        if (!viewer.getControl().isDisposed()) {
            viewer.setInput(findings);
            setContentDescription(findings.isEmpty() ? "Nothing found" : findings.size() + " found");
        }
    }

    @Override
    public void setFocus() {
        viewer.getControl().setFocus();
    }

    @Override
    public void dispose() {
        leave();
        getSite().getPage().removePartListener(parts);
        super.dispose();
    }

    private final class ActiveEditor implements IPartListener {

        @Override
        public void partActivated(IWorkbenchPart part) {
            if (part instanceof StudyEditor study) {
                follow(study);
            }
        }

        @Override
        public void partBroughtToTop(IWorkbenchPart part) {
            partActivated(part);
        }

        @Override
        public void partClosed(IWorkbenchPart part) {
            if (part == editor) {
                leave();
                show(List.of());
            }
        }

        @Override
        public void partDeactivated(IWorkbenchPart part) {
            // the last editor stays shown
        }

        @Override
        public void partOpened(IWorkbenchPart part) {
            // activation follows
        }
    }
}

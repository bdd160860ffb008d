/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app;

import java.nio.file.Path;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.wizard.WizardDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.part.ViewPart;
import spanfield.ui.common.RecentStudies;

/** Where a newcomer begins: how to model a cross-section, make the edge table, and go on with a recent study. */
public final class StartView extends ViewPart {

    static final String ID = "spanfield.app.start";
    private static final int MOST_RECENT = 5;
    /** Width that texts ask for; they wrap at the width they get. */
    private static final int TEXT_WIDTH = 420;

    private Composite content;

    @Override
    public void createPartControl(Composite parent) {
        ScrolledComposite scroll = new ScrolledComposite(parent, SWT.V_SCROLL | SWT.H_SCROLL);
        content = new Composite(scroll, SWT.NONE);
        GridLayoutFactory.swtDefaults().margins(12, 10).spacing(5, 6).applyTo(content);
        heading("Model a cross-section");
        link("<a>New study</a> from a template, or <a>open a study</a>. The Outline holds all parts of it; what you choose there is changed in Properties.",
            this::create, () -> Studies.choose(window()));
        heading("Make the edge table");
        text("Type the loads on the page Loads, then read the page Edge table: both edges, the greatest value within, the errors, and the margin to each "
            + "limit. The page Profile shows the curves and exports them.");
        link("<a>A first study, step by step</a>", () -> new org.eclipse.ui.cheatsheets.OpenCheatSheetAction("spanfield.app.firstStudy").run());
        heading("Go on with a recent study");
        int shown = 0;
        for (Path path : RecentStudies.list()) {
            if (shown++ < MOST_RECENT) {
                link("<a>" + path.getFileName().toString().replace("&", "&&") + "</a>   " + path.getParent(), () -> Studies.open(window(), path));
            }
        }
        if (shown == 0) {
            text("None yet.");
        }
        text("For planning and screening. Local codes and licensed practice decide; live lines can kill.");
        scroll.setContent(content);
        scroll.setExpandHorizontal(true);
        scroll.setExpandVertical(true);
        scroll.addListener(SWT.Resize, event -> scroll.setMinSize(content.computeSize(scroll.getClientArea().width, SWT.DEFAULT)));
    }

    private IWorkbenchWindow window() {
        return getSite().getWorkbenchWindow();
    }

    private void create() {
        new WizardDialog(window().getShell(), new NewStudyWizard(window())).open();
    }

    private void heading(String text) {
        Label label = new Label(content, SWT.NONE);
        label.setFont(JFaceResources.getBannerFont());
        label.setText(text);
    }

    private void text(String text) {
        Label label = new Label(content, SWT.WRAP);
        label.setText(text);
        GridDataFactory.fillDefaults().grab(true, false).hint(TEXT_WIDTH, SWT.DEFAULT).applyTo(label);
    }

    private void link(String text, Runnable... actions) {
        Link link = new Link(content, SWT.WRAP);
        link.setText(text);
        GridDataFactory.fillDefaults().grab(true, false).hint(TEXT_WIDTH, SWT.DEFAULT).applyTo(link);
        link.addListener(SWT.Selection, event -> {
            int which = actions.length > 1 && event.text.startsWith("open") ? 1 : 0;
            actions[which].run();
        });
    }

    @Override
    public void setFocus() {
        content.setFocus();
    }
}

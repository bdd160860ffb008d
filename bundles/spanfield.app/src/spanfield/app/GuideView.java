/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app;

import java.util.LinkedHashMap;
import java.util.Map;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.events.ExpansionAdapter;
import org.eclipse.ui.forms.events.ExpansionEvent;
import org.eclipse.ui.forms.widgets.ExpandableComposite;
import org.eclipse.ui.forms.widgets.FormText;
import org.eclipse.ui.forms.widgets.FormToolkit;
import org.eclipse.ui.forms.widgets.ScrolledForm;
import org.eclipse.ui.forms.widgets.Section;
import org.eclipse.ui.forms.widgets.TableWrapData;
import org.eclipse.ui.forms.widgets.TableWrapLayout;
import org.eclipse.ui.part.ViewPart;

/** The guide: a section for each page of the editor and for each quantity. F1 opens it at the page in use. */
public final class GuideView extends ViewPart {

    static final String ID = "spanfield.app.guide";

    private final Map<String, Section> sections = new LinkedHashMap<>();
    private FormToolkit toolkit;
    private ScrolledForm form;

    @Override
    public void createPartControl(Composite parent) {
        toolkit = new FormToolkit(parent.getDisplay());
        form = toolkit.createScrolledForm(parent);
        form.getBody().setLayout(new TableWrapLayout());
        addPart("Pages", "pages");
        addPart("Quantities", "quantities");
    }

    private void addPart(String heading, String part) {
        toolkit.createLabel(form.getBody(), heading).setFont(org.eclipse.jface.resource.JFaceResources.getBannerFont());
        for (GuideText.Topic topic : GuideText.read(part)) {
            Section section = toolkit.createSection(form.getBody(), ExpandableComposite.TWISTIE | ExpandableComposite.CLIENT_INDENT);
            section.setText(topic.title());
            section.setLayoutData(new TableWrapData(TableWrapData.FILL_GRAB));
            FormText text = toolkit.createFormText(section, true);
            text.setText(topic.markup(), true, false);
            section.setClient(text);
            section.addExpansionListener(new ExpansionAdapter() {
                @Override
                public void expansionStateChanged(ExpansionEvent event) {
                    form.reflow(true);
                }
            });
            sections.put(topic.title(), section);
        }
    }

    /** Opens a topic by its title and closes the others; an unknown title leaves the guide as it is. */
    public void show(String title) {
        Section wanted = sections.get(title);
        if (wanted == null) {
            return;
        }
        sections.values().forEach(section -> section.setExpanded(section == wanted));
        form.reflow(true);
        form.setOrigin(wanted.getLocation());
    }

    /** Titles of the topics, in order. */
    public java.util.List<String> titles() {
        return java.util.List.copyOf(sections.keySet());
    }

    @Override
    public void setFocus() {
        form.setFocus();
    }

    @Override
    public void dispose() {
        if (toolkit != null) {
            toolkit.dispose();
        }
        super.dispose();
    }
}

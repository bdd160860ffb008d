/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app;

import java.nio.file.Path;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.ActionContributionItem;
import org.eclipse.jface.action.ICoolBarManager;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.jface.action.ToolBarManager;
import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.jface.wizard.WizardDialog;
import org.eclipse.swt.SWT;
import org.eclipse.ui.ISharedImages;
import org.eclipse.ui.IWorkbenchActionConstants;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.actions.ActionFactory.IWorkbenchAction;
import org.eclipse.ui.actions.ContributionItemFactory;
import org.eclipse.ui.application.ActionBarAdvisor;
import org.eclipse.ui.application.IActionBarConfigurer;
import org.eclipse.ui.cheatsheets.OpenCheatSheetAction;
import spanfield.ui.common.RecentStudies;
import spanfield.ui.common.StudyEditor;

/** Menus and tool bar: the platform's own actions where it has them. */
final class MenuAdvisor extends ActionBarAdvisor {

    private IWorkbenchWindow window;
    private Action create;
    private Action open;
    private Action start;
    private Action guide;
    private Action firstStudy;
    private IWorkbenchAction save;
    private IWorkbenchAction saveAs;
    private IWorkbenchAction saveAll;
    private IWorkbenchAction close;
    private IWorkbenchAction quit;
    private IWorkbenchAction undo;
    private IWorkbenchAction redo;
    private IWorkbenchAction about;

    MenuAdvisor(IActionBarConfigurer configurer) {
        super(configurer);
    }

    @Override
    protected void makeActions(IWorkbenchWindow owner) {
        window = owner;
        create = action("New study...", SWT.MOD1 + 'N', ISharedImages.IMG_TOOL_NEW_WIZARD,
            () -> new WizardDialog(window.getShell(), new NewStudyWizard(window)).open());
        open = action("Open study...", SWT.MOD1 + 'O', ISharedImages.IMG_OBJ_FOLDER, () -> Studies.choose(window));
        start = action("Start", 0, null, () -> {
            try {
                window.getActivePage().showView(StartView.ID);
            } catch (PartInitException impossible) {
                throw new IllegalStateException(impossible);
            }
        });
        guide = action("Guide", SWT.F1, null, this::openGuide);
        firstStudy = action("A first study, step by step", 0, null, () -> new OpenCheatSheetAction("spanfield.app.firstStudy").run());
        save = platform(ActionFactory.SAVE);
        saveAs = platform(ActionFactory.SAVE_AS);
        saveAll = platform(ActionFactory.SAVE_ALL);
        close = platform(ActionFactory.CLOSE);
        quit = platform(ActionFactory.QUIT);
        undo = platform(ActionFactory.UNDO);
        redo = platform(ActionFactory.REDO);
        about = platform(ActionFactory.ABOUT);
    }

    /** Opens the guide at the page that is in use. */
    private void openGuide() {
        try {
            GuideView view = (GuideView) window.getActivePage().showView(GuideView.ID);
            if (window.getActivePage().getActiveEditor() instanceof StudyEditor editor) {
                view.show(editor.activePageName());
            }
        } catch (PartInitException impossible) {
            throw new IllegalStateException(impossible);
        }
    }

    private IWorkbenchAction platform(ActionFactory factory) {
        IWorkbenchAction action = factory.create(window);
        register(action);
        return action;
    }

    private Action action(String text, int key, String image, Runnable run) {
        Action action = new Action(text) {
            @Override
            public void run() {
                run.run();
            }
        };
        if (key != 0) {
            action.setAccelerator(key);
        }
        if (image != null) {
            ImageDescriptor descriptor = window.getWorkbench().getSharedImages().getImageDescriptor(image);
            action.setImageDescriptor(descriptor);
        }
        return action;
    }

    @Override
    protected void fillMenuBar(IMenuManager bar) {
        MenuManager file = new MenuManager("&File", IWorkbenchActionConstants.M_FILE);
        file.add(create);
        file.add(open);
        file.add(recent());
        file.add(new Separator());
        file.add(close);
        file.add(new Separator());
        file.add(save);
        file.add(saveAs);
        file.add(saveAll);
        file.add(new Separator(IWorkbenchActionConstants.MB_ADDITIONS));
        file.add(quit);
        MenuManager edit = new MenuManager("&Edit", IWorkbenchActionConstants.M_EDIT);
        edit.add(undo);
        edit.add(redo);
        edit.add(new Separator(IWorkbenchActionConstants.MB_ADDITIONS));
        MenuManager views = new MenuManager("&Window", IWorkbenchActionConstants.M_WINDOW);
        MenuManager show = new MenuManager("Show view");
        show.add(ContributionItemFactory.VIEWS_SHORTLIST.create(window));
        views.add(show);
        MenuManager help = new MenuManager("&Help", IWorkbenchActionConstants.M_HELP);
        help.add(start);
        help.add(guide);
        help.add(firstStudy);
        help.add(new Separator(IWorkbenchActionConstants.MB_ADDITIONS));
        help.add(about);
        bar.add(file);
        bar.add(edit);
        bar.add(new Separator(IWorkbenchActionConstants.MB_ADDITIONS));
        bar.add(views);
        bar.add(help);
    }

    private MenuManager recent() {
        MenuManager menu = new MenuManager("Recent studies");
        menu.setRemoveAllWhenShown(true);
        menu.addMenuListener(manager -> {
            for (Path path : RecentStudies.list()) {
                manager.add(action(path.getFileName() + "  -  " + path.getParent(), 0, null, () -> Studies.open(window, path)));
            }
            if (manager.isEmpty()) {
                Action none = action("None yet", 0, null, () -> { });
                none.setEnabled(false);
                manager.add(none);
            }
        });
        // a menu that fills itself must not be empty before it is shown
        menu.add(action("None yet", 0, null, () -> { }));
        return menu;
    }

    @Override
    protected void fillCoolBar(ICoolBarManager bar) {
        ToolBarManager tools = new ToolBarManager(bar.getStyle());
        tools.add(new ActionContributionItem(create));
        tools.add(new ActionContributionItem(open));
        tools.add(save);
        tools.add(new Separator());
        tools.add(undo);
        tools.add(redo);
        bar.add(tools);
    }
}

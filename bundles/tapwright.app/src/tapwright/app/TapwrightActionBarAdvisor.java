// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import org.eclipse.jface.action.GroupMarker;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.ui.IWorkbenchActionConstants;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.actions.ActionFactory.IWorkbenchAction;
import org.eclipse.ui.actions.ContributionItemFactory;
import org.eclipse.ui.application.ActionBarAdvisor;
import org.eclipse.ui.application.IActionBarConfigurer;

/** Menu bar and tool bar: what an owner of filters uses, in the places where Eclipse has it. */
final class TapwrightActionBarAdvisor extends ActionBarAdvisor {

	private IWorkbenchWindow window;

	TapwrightActionBarAdvisor(IActionBarConfigurer configurer) {
		super(configurer);
	}

	@Override
	protected void makeActions(IWorkbenchWindow made) {
		window = made;
		for (ActionFactory factory : new ActionFactory[] { ActionFactory.NEW, ActionFactory.CLOSE, ActionFactory.CLOSE_ALL,
				ActionFactory.SAVE, ActionFactory.SAVE_ALL, ActionFactory.REVERT, ActionFactory.REFRESH, ActionFactory.RENAME,
				ActionFactory.IMPORT, ActionFactory.EXPORT, ActionFactory.QUIT, ActionFactory.UNDO, ActionFactory.REDO,
				ActionFactory.CUT, ActionFactory.COPY, ActionFactory.PASTE, ActionFactory.DELETE, ActionFactory.SELECT_ALL,
				ActionFactory.RESET_PERSPECTIVE, ActionFactory.PREFERENCES, ActionFactory.ABOUT, ActionFactory.NEXT_EDITOR,
				ActionFactory.PREVIOUS_EDITOR, ActionFactory.MAXIMIZE, ActionFactory.ACTIVATE_EDITOR }) {
			register(factory.create(window));
		}
	}

	@Override
	protected void fillMenuBar(IMenuManager bar) {
		IMenuManager file = menu(bar, "&File", IWorkbenchActionConstants.M_FILE, ActionFactory.NEW, null, ActionFactory.CLOSE,
				ActionFactory.CLOSE_ALL, null, ActionFactory.SAVE, ActionFactory.SAVE_ALL, null, ActionFactory.RENAME,
				ActionFactory.REFRESH, null);
		file.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
		fill(file, ActionFactory.IMPORT, ActionFactory.EXPORT, null, ActionFactory.QUIT);
		menu(bar, "&Edit", IWorkbenchActionConstants.M_EDIT, ActionFactory.UNDO, ActionFactory.REDO, null, ActionFactory.CUT,
				ActionFactory.COPY, ActionFactory.PASTE, null, ActionFactory.DELETE, ActionFactory.SELECT_ALL, null)
				.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
		bar.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
		IMenuManager view = menu(bar, "&Window", IWorkbenchActionConstants.M_WINDOW);
		var views = new MenuManager("Show &View", "showView");
		views.add(ContributionItemFactory.VIEWS_SHORTLIST.create(window));
		view.add(views);
		fill(view, null, ActionFactory.MAXIMIZE, ActionFactory.ACTIVATE_EDITOR, ActionFactory.NEXT_EDITOR,
				ActionFactory.PREVIOUS_EDITOR, null, ActionFactory.RESET_PERSPECTIVE, ActionFactory.PREFERENCES);
		IMenuManager help = menu(bar, "&Help", IWorkbenchActionConstants.M_HELP);
		help.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
		fill(help, ActionFactory.ABOUT);
	}

	private IMenuManager menu(IMenuManager bar, String title, String id, ActionFactory... actions) {
		var menu = new MenuManager(title, id);
		bar.add(menu);
		fill(menu, actions);
		return menu;
	}

	private void fill(IMenuManager menu, ActionFactory... actions) {
		for (ActionFactory factory : actions) {
			if (factory == null) {
				menu.add(new Separator());
			} else {
				menu.add(action(factory));
			}
		}
	}

	private IWorkbenchAction action(ActionFactory factory) {
		return (IWorkbenchAction) getAction(factory.getId());
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.command.AddCommand;
import org.eclipse.emf.edit.command.DeleteCommand;
import org.eclipse.emf.edit.command.MoveCommand;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Menu;
import org.eclipse.swt.widgets.MenuItem;
import org.eclipse.swt.widgets.ToolBar;
import org.eclipse.swt.widgets.ToolItem;

import tapwright.core.meta.Meta;
import tapwright.model.Filter;
import tapwright.model.ModelPackage;
import tapwright.model.Requirement;
import tapwright.ui.look.Icons;

/** Adds, copies, moves and removes requirements, each by one command that can be undone. UI thread. */
final class RequirementCommands {

	private final FilterEditor editor;
	private final RequirementTable table;
	private ToolItem duplicate;
	private ToolItem remove;
	private ToolItem up;
	private ToolItem down;

	RequirementCommands(FilterEditor editor, RequirementTable table) {
		this.editor = editor;
		this.table = table;
	}

	void createToolBar(Composite parent) {
		var tools = new ToolBar(parent, SWT.FLAT | SWT.RIGHT);
		var add = new ToolItem(tools, SWT.DROP_DOWN);
		add.setImage(Icons.get(Icons.ADD));
		add.setText("Add");
		add.setToolTipText("Add a requirement of a kind that you choose");
		Menu kinds = kindMenu(tools);
		add.addListener(SWT.Selection, event -> {
			Rectangle bounds = add.getBounds();
			kinds.setLocation(tools.toDisplay(bounds.x, bounds.y + bounds.height));
			kinds.setVisible(true);
		});
		duplicate = item(tools, Icons.DUPLICATE, "Duplicate", this::duplicate);
		remove = item(tools, Icons.REMOVE, "Remove (Delete)", this::remove);
		up = item(tools, Icons.UP, "Move up (Alt+Up)", () -> move(-1));
		down = item(tools, Icons.DOWN, "Move down (Alt+Down)", () -> move(1));
	}

	private static ToolItem item(ToolBar tools, String icon, String tip, Runnable action) {
		var item = new ToolItem(tools, SWT.PUSH);
		item.setImage(Icons.get(icon));
		item.setToolTipText(tip);
		item.addListener(SWT.Selection, event -> action.run());
		return item;
	}

	private Menu kindMenu(Control owner) {
		var menu = new Menu(owner);
		for (EClass kind : OfferedKinds.requirements()) {
			var item = new MenuItem(menu, SWT.PUSH);
			item.setText(Meta.label(kind));
			item.setToolTipText(Meta.documentation(kind));
			item.addListener(SWT.Selection, event -> add((Requirement) EcoreUtil.create(kind)));
		}
		owner.addDisposeListener(event -> menu.dispose());
		return menu;
	}

	void bindKeys(Control control) {
		control.addListener(SWT.KeyDown, event -> {
			boolean alt = (event.stateMask & SWT.MOD3) != 0;
			if (event.keyCode == SWT.DEL) {
				remove();
			} else if (alt && event.keyCode == SWT.ARROW_UP) {
				move(-1);
			} else if (alt && event.keyCode == SWT.ARROW_DOWN) {
				move(1);
			}
		});
	}

	void update() {
		List<Requirement> selected = table.selected();
		List<Requirement> all = filter().getRequirements();
		boolean one = selected.size() == 1;
		duplicate.setEnabled(!selected.isEmpty());
		remove.setEnabled(!selected.isEmpty());
		up.setEnabled(one && all.indexOf(selected.getFirst()) > 0);
		down.setEnabled(one && all.indexOf(selected.getFirst()) < all.size() - 1);
	}

	private Filter filter() {
		return editor.document().root();
	}

	private EditingDomain domain() {
		return editor.getEditingDomain();
	}

	private void execute(Command command) {
		domain().getCommandStack().execute(command);
	}

	private void add(Requirement requirement) {
		requirement.setId(freeId(Meta.kind(requirement.eClass())));
		addAll(List.of(requirement));
		table.select(requirement);
	}

	private void addAll(Collection<Requirement> requirements) {
		execute(AddCommand.create(domain(), filter(), ModelPackage.Literals.FILTER__REQUIREMENTS, requirements));
	}

	private void duplicate() {
		List<Requirement> copies = table.selected().stream().map(EcoreUtil::copy).toList();
		for (Requirement copy : copies) {
			copy.setId(freeId(copy.getId()));
			addAll(List.of(copy)); // one by one, so that each gets an id of its own
		}
		if (!copies.isEmpty()) {
			table.select(copies.getLast());
		}
	}

	private String freeId(String wish) {
		Set<String> taken = new HashSet<>();
		filter().getRequirements().forEach(requirement -> taken.add(requirement.getId()));
		String base = wish == null ? "requirement" : wish.replaceFirst("-\\d+$", "");
		String id = base;
		for (int k = 2; taken.contains(id); k++) {
			id = base + "-" + k;
		}
		return id;
	}

	private void remove() {
		List<Requirement> selected = table.selected();
		if (!selected.isEmpty()) {
			execute(DeleteCommand.create(domain(), selected));
		}
	}

	private void move(int by) {
		List<Requirement> selected = table.selected();
		if (selected.size() != 1) {
			return;
		}
		int index = filter().getRequirements().indexOf(selected.getFirst()) + by;
		if (index >= 0 && index < filter().getRequirements().size()) {
			execute(MoveCommand.create(domain(), filter(), ModelPackage.Literals.FILTER__REQUIREMENTS, selected.getFirst(),
					index));
			table.select(selected.getFirst());
		}
	}
}

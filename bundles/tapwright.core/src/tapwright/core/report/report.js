// Makes the columns of tables sortable; everything can be read without.
"use strict";
for (const table of document.querySelectorAll("table.sortable")) {
	table.querySelectorAll("thead th").forEach((head, column) => {
		const button = document.createElement("button");
		button.type = "button";
		button.append(...head.childNodes);
		head.append(button);
		button.addEventListener("click", () => {
			const descending = head.getAttribute("aria-sort") === "ascending";
			table.querySelectorAll("thead th").forEach(other => other.removeAttribute("aria-sort"));
			head.setAttribute("aria-sort", descending ? "descending" : "ascending");
			const key = row => row.cells[column].dataset.key ?? row.cells[column].textContent.trim();
			const compare = (a, b) => key(a).localeCompare(key(b), "en", { numeric: true }) ;
			const number = (a, b) => Number(key(a)) - Number(key(b));
			const body = table.tBodies[0];
			const rows = [...body.rows];
			const numeric = rows.every(row => key(row) !== "" && Number.isFinite(Number(key(row))));
			rows.sort(numeric ? number : compare);
			body.append(...(descending ? rows.reverse() : rows));
		});
	});
}

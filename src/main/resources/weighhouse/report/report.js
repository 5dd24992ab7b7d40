"use strict";
(() => {
  const all = (selector, root = document) => Array.from(root.querySelectorAll(selector));
  const findings = all("article.finding");
  const rows = all(".overview tbody tr");

  const form = document.getElementById("filter");
  if (form) {
    const status = document.getElementById("shown");
    const apply = () => {
      const severities = new Set(all("[name=severity]", form).filter(box => box.checked).map(box => box.value));
      const family = form.elements.family.value;
      const sheet = form.elements.sheet.value;
      const fits = item => severities.has(item.dataset.severity)
        && (!family || item.dataset.family === family)
        && (!sheet || item.dataset.sheets.split("\n").includes(sheet));
      rows.forEach(row => { row.hidden = !fits(row); });
      findings.forEach(finding => { finding.hidden = !fits(finding); });
      const shown = findings.filter(finding => !finding.hidden).length;
      status.textContent = `${shown} of ${findings.length} shown`;
    };
    form.hidden = false;
    form.addEventListener("input", apply);
    form.addEventListener("submit", event => event.preventDefault());
    form.reset();
    apply();
  }

  const copy = async (text, code) => {
    try {
      await navigator.clipboard.writeText(text);
    } catch (refused) {
      const range = document.createRange();
      range.selectNodeContents(code);
      const selection = window.getSelection();
      selection.removeAllRanges();
      selection.addRange(range);
      return document.execCommand("copy");
    }
    return true;
  };
  all("button.copy").forEach(button => {
    button.hidden = false;
    button.addEventListener("click", async () => {
      const code = button.parentElement.querySelector("code");
      const done = await copy(code.textContent, code);
      button.textContent = done ? "Copied" : "Press Ctrl+C";
      setTimeout(() => { button.textContent = "Copy"; }, 2000);
    });
  });

  const search = document.getElementById("search");
  if (search) {
    search.closest("label").hidden = false;
    const quantities = all("#quantity-rows tr").map(row => [row, row.textContent.toLowerCase()]);
    const found = document.getElementById("found");
    search.addEventListener("input", () => {
      const words = search.value.toLowerCase().split(/\s+/).filter(Boolean);
      let count = 0;
      quantities.forEach(([row, text]) => {
        row.hidden = !words.every(word => text.includes(word));
        count += row.hidden ? 0 : 1;
      });
      found.textContent = `${count} of ${quantities.length} ranges`;
    });
  }
})();

const entities = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

class Markup {
  constructor(text) {
    this.text = text;
  }
}

function render(value) {
  if (value instanceof Markup) return value.text;
  if (Array.isArray(value)) return value.map(render).join('');
  if (value === undefined || value === false) return '';
  return String(value).replace(/[&<>"']/g, (character) => entities[character]);
}

/** Tagged template for a page: whatever is put in is escaped, unless it is such a template itself. */
export function html(strings, ...values) {
  return new Markup(strings.reduce((text, part, i) => text + render(values[i - 1]) + part));
}

/** The finished text. */
export const toText = (markup) => render(markup);

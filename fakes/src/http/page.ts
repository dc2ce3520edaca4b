const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Markup that may be placed in a page as it stands. */
export class Markup {
  constructor(readonly text: string) {}
}

/** Template tag: every value is escaped unless it is `Markup` already; lists are joined, nothing is printed for false and undefined. */
export function markup(parts: TemplateStringsArray, ...values: readonly unknown[]): Markup {
  return new Markup(parts.map((part, index) => part + render(values[index])).join(''));
}

function render(value: unknown): string {
  if (value === undefined || value === null || value === false) return '';
  if (value instanceof Markup) return value.text;
  if (Array.isArray(value)) return value.map(render).join('');
  if (typeof value === 'string' || typeof value === 'number') return escape(String(value));
  throw new TypeError(`A page cannot show ${typeof value}.`);
}

function escape(text: string): string {
  return text.replace(/[&<>"']/g, (character) => ENTITIES[character] ?? character);
}

const STYLE = new Markup(`
  :root { color-scheme: light; }
  * { box-sizing: border-box; }
  body { margin: 0; font: 16px/1.5 system-ui, sans-serif; color: #1b1b1b; background: #fff; }
  .test { margin: 0; padding: 8px 16px; background: #1b1b1b; color: #fff; font-size: 14px; }
  main { max-width: 640px; margin: 0 auto; padding: 16px; overflow-wrap: anywhere; }
  main.wide { max-width: 960px; }
  h1 { font-size: 24px; line-height: 1.25; margin: 16px 0 8px; }
  h2 { font-size: 18px; margin: 24px 0 8px; }
  table { width: 100%; border-collapse: collapse; }
  th, td { text-align: left; vertical-align: top; padding: 6px 8px 6px 0; border-bottom: 1px solid #767676; }
  caption { text-align: left; }
  td.number, th.number { text-align: right; padding: 6px 0 6px 8px; white-space: nowrap; }
  label { display: block; margin: 12px 0 4px; font-weight: 600; }
  input { width: 100%; font: inherit; padding: 8px; border: 1px solid #5b5b5b; border-radius: 0; background: #fff; color: inherit; }
  input[aria-invalid="true"] { border: 2px solid #9b1c1c; }
  .pair { display: grid; grid-template-columns: 1fr 1fr; gap: 16px; }
  button { font: inherit; margin: 16px 16px 0 0; padding: 10px 16px; min-height: 44px; border: 1px solid #1b1b1b; background: #e7e7e7; color: #1b1b1b; cursor: pointer; }
  a { color: #0a3c8c; }
  a:focus-visible, input:focus-visible, button:focus-visible, iframe:focus-visible { outline: 3px solid #0a3c8c; outline-offset: 2px; }
  .fault { border: 2px solid #9b1c1c; margin: 8px 0; padding: 8px 12px; color: #7d1414; }
  .hint { color: #4a4a4a; font-size: 14px; margin: 4px 0; }
  .scroll { overflow-x: auto; }
  iframe { width: 100%; height: 60vh; border: 1px solid #5b5b5b; background: #fff; }
  pre { white-space: pre-wrap; border: 1px solid #767676; padding: 8px; font: 14px/1.5 ui-monospace, monospace; }
  dl { display: grid; grid-template-columns: max-content 1fr; gap: 4px 12px; }
  dt { font-weight: 600; } dd { margin: 0; }
`);

/** A whole page under the bar that says it is a test page. */
export function page(title: string, bar: string, content: Markup, wide = false): string {
  const main = wide ? new Markup('<main class="wide">') : new Markup('<main>');
  return markup`<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${title} (test)</title>
<style>${STYLE}</style>
</head>
<body>
<header><p class="test"><strong>test</strong> ${bar}</p></header>
${main}
${content}
</main>
</body>
</html>
`.text;
}

const escapes: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};
export const escape = (text: string): string => text.replaceAll(/[&<>"']/g, (sign) => escapes[sign] ?? sign);

export const style = `
:root{color-scheme:light dark;--paper:#F6F2EA;--sheet:#FFFDF8;--ink:#1D2327;--pencil:#5B6469;--rule:#D9D2C3;--copper:#9A4A22;--red:#9B2C23}
@media (prefers-color-scheme:dark){:root{--paper:#161A1C;--sheet:#1E2326;--ink:#ECE7DC;--pencil:#A9B1B4;--rule:#3A4145;--copper:#E09A6B;--red:#F0938A}}
*{box-sizing:border-box}body{margin:0;background:var(--paper);color:var(--ink);font:400 16px/26px system-ui,sans-serif}
main{max-width:28rem;margin:0 auto;padding:2rem 1rem}main.wide{max-width:60rem}
h1{font-size:1.75rem;line-height:2rem;margin:0 0 .5rem}p{margin:.5rem 0}.note{color:var(--pencil)}
form{display:grid;gap:1rem;margin:1.5rem 0}label{font-weight:500;display:block}
input{font:inherit;width:100%;padding:.6rem .75rem;border:1px solid var(--ink);border-radius:2px;background:var(--sheet);color:inherit}
.fault{color:var(--red);display:block}.two{display:grid;grid-template-columns:1fr 1fr;gap:1rem}
button,a.button{font:inherit;font-weight:500;padding:.65rem 1.25rem;border-radius:2px;border:1px solid var(--copper);background:var(--copper);color:var(--paper);cursor:pointer;text-decoration:none;display:inline-block}
button.quiet,a.quiet{background:none;color:var(--ink);border-color:var(--ink)}
.sheet{background:var(--sheet);border:1px solid var(--rule);padding:1rem}.scroll{overflow-x:auto}
table{border-collapse:collapse;width:100%;font-size:.9rem}td,th{text-align:left;padding:.4rem .75rem .4rem 0;border-bottom:1px solid var(--rule);vertical-align:top}
td form{display:inline;margin:0}.row{display:flex;gap:.5rem;flex-wrap:wrap}.row form{margin:0}
`;

/** A whole page; the stand-in has no scripts. */
export const page = (title: string, body: string, isWide = false): string => `<!doctype html>
<html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1">
<title>${escape(title)}</title><link rel="icon" href="data:,"><link rel="stylesheet" href="/style.css"></head>
<body><main${isWide ? ' class="wide"' : ''}>${body}</main></body></html>`;

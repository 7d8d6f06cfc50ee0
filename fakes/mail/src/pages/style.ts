import { createHash } from 'node:crypto';

/** A pigeonhole list: hairlines, one accent, both colour schemes. */
export const STYLE = `
:root { color-scheme: light dark; --page: #f4f1ea; --sheet: #fffdf8; --ink: #26241f; --soft: #5d584d; --hair: #d9d3c5; --link: #17566b; --focus: #17566b; }
@media (prefers-color-scheme: dark) { :root { --page: #191814; --sheet: #23211c; --ink: #ece8dd; --soft: #b7b09f; --hair: #433f35; --link: #8cc9db; --focus: #8cc9db; } }
* { box-sizing: border-box; }
body { margin: 0; padding: 16px; background: var(--page); color: var(--ink); font: 16px/1.5 system-ui, "Segoe UI", "DejaVu Sans", sans-serif; font-variant-numeric: tabular-nums; }
main { max-width: 860px; margin: 0 auto; }
h1 { font-size: 22px; line-height: 1.2; margin: 0 0 8px; overflow-wrap: anywhere; }
h2 { font-size: 18px; line-height: 1.2; margin: 28px 0 8px; }
p { margin: 0 0 12px; }
.soft { color: var(--soft); }
a { color: var(--link); display: inline-block; min-height: 44px; padding: 9px 0; }
.inbox { list-style: none; margin: 16px 0 0; padding: 0; background: var(--sheet); border-top: 2px solid var(--ink); }
.inbox li { border-bottom: 1px solid var(--hair); padding: 4px 12px 10px; overflow-wrap: anywhere; }
.inbox a { font-weight: 700; }
.inbox p { margin: 0; font-size: 14px; color: var(--soft); }
dl { margin: 0; background: var(--sheet); border-top: 2px solid var(--ink); }
dl div { display: flex; flex-wrap: wrap; gap: 0 12px; padding: 6px 12px; border-bottom: 1px solid var(--hair); }
dt { flex: 0 0 160px; color: var(--soft); } dd { flex: 1 1 240px; margin: 0; overflow-wrap: anywhere; min-width: 0; }
pre { margin: 0; padding: 12px; background: var(--sheet); border-top: 2px solid var(--ink); white-space: pre-wrap; overflow-wrap: anywhere; font: 14px/1.5 ui-monospace, "DejaVu Sans Mono", monospace; }
iframe { width: 100%; height: 640px; border: 0; border-top: 2px solid var(--ink); background: #ffffff; }
:focus-visible { outline: 3px solid var(--focus); outline-offset: 2px; }
`;

/** No scripts, our style only; the message itself comes in a frame with a stricter rule of its own. */
export const PAGE_POLICY = [
  "default-src 'none'",
  `style-src 'sha256-${createHash('sha256').update(STYLE).digest('base64')}'`,
  "frame-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
].join('; ');

/** For a message's HTML: its own inline style and pictures sent with it, nothing from outside, no scripts. */
export const MESSAGE_POLICY =
  "sandbox allow-popups; default-src 'none'; style-src 'unsafe-inline'; img-src data:; base-uri 'none'; form-action 'none'; frame-ancestors 'self'";

import { createHash } from 'node:crypto';

/** A ruled sheet of paper: nothing like a bank's or a payment service's screen, so that nobody takes it for one. */
export const STYLE = `
:root { color-scheme: light dark; --page: #f3f4ee; --sheet: #fffef9; --ink: #22282b; --soft: #525c60; --line: #7c868a;
  --hair: #d4d6cc; --act: #2f5b3a; --on-act: #ffffff; --bad: #96281f; --bad-bg: #f9e7e4; --note-bg: #fbf1cf; --focus: #1b5f8c; }
@media (prefers-color-scheme: dark) { :root { --page: #171b1c; --sheet: #1f2527; --ink: #ecebe4; --soft: #b1babd; --line: #7f8b90;
  --hair: #3a4346; --act: #9fd0a8; --on-act: #12261a; --bad: #f5a8a0; --bad-bg: #3d2220; --note-bg: #3a331b; --focus: #8fc7ec; } }
* { box-sizing: border-box; }
body { margin: 0; padding: 16px; background: var(--page); color: var(--ink);
  font: 16px/1.5 system-ui, "Segoe UI", "DejaVu Sans", sans-serif; font-variant-numeric: tabular-nums; }
main { max-width: 560px; margin: 0 auto; background: var(--sheet); border: 1px dashed var(--line); padding: 20px 16px 24px; }
h1 { font-size: 22px; line-height: 1.2; margin: 0 0 12px; }
h2 { font-size: 18px; line-height: 1.2; margin: 28px 0 8px; }
p { margin: 0 0 12px; }
.note { background: var(--note-bg); padding: 8px 12px; }
.bad { background: var(--bad-bg); border-left: 4px solid var(--bad); padding: 8px 12px; margin: 0 0 16px; }
.bad h2 { margin: 0 0 4px; color: var(--bad); }
.bad p, .bad ul { margin: 0; } .bad ul { padding-left: 20px; }
table { width: 100%; border-collapse: collapse; margin: 0 0 12px; }
caption { text-align: left; color: var(--soft); }
th, td { text-align: left; vertical-align: top; padding: 6px 8px 6px 0; border-bottom: 1px solid var(--hair); font-weight: 400; }
th[scope="row"] { overflow-wrap: anywhere; }
td:last-child, th:last-child { text-align: right; padding-right: 0; } td.money { white-space: nowrap; }
tfoot th, tfoot td { font-weight: 700; border-bottom: 0; }
ul.cards { list-style: none; margin: 0; padding: 0; }
.cards li { padding: 6px 0; border-bottom: 1px solid var(--hair); }
.cards code { font-weight: 600; }
label { display: block; font-weight: 600; margin: 16px 0 2px; }
.hint { color: var(--soft); font-size: 14px; margin: 0 0 4px; }
.error { color: var(--bad); font-weight: 600; margin: 0 0 4px; }
input { display: block; width: 100%; min-height: 44px; font: inherit; color: inherit; background: var(--page);
  border: 1px solid var(--line); padding: 8px 10px; }
input[aria-invalid="true"] { border: 2px solid var(--bad); }
.short { max-width: 160px; }
button, .button { display: inline-block; min-height: 44px; font: inherit; font-weight: 700; padding: 9px 18px; margin: 20px 12px 0 0;
  border: 1px solid var(--act); background: var(--act); color: var(--on-act); cursor: pointer; text-decoration: none; }
.quiet { background: transparent; color: var(--ink); border-color: var(--line); }
form.row { display: inline; }
a { color: inherit; }
code { font: inherit; white-space: nowrap; }
:focus-visible { outline: 3px solid var(--focus); outline-offset: 2px; }
`;

/** Only this very style may run: no scripts, nothing from anywhere else. */
export const CONTENT_SECURITY_POLICY = [
  "default-src 'none'",
  `style-src 'sha256-${createHash('sha256').update(STYLE).digest('base64')}'`,
  "base-uri 'none'",
  "frame-ancestors 'none'",
].join('; ');

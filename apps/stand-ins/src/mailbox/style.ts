/** The colours of the workshop: paper, card, manila, ink, stitch and verdigris. */
export const style = `
:root {
  color-scheme: light dark;
  --paper: #f7f4ed; --card: #fffdf8; --manila: #f0e3c4; --ink: #23201b; --ink-soft: #5e574c;
  --stitch: #cdbf9f; --verdigris: #22665a;
}
@media (prefers-color-scheme: dark) {
  :root {
    --paper: #1d1b17; --card: #272420; --manila: #3a3326; --ink: #f2ede2; --ink-soft: #bfb6a5;
    --stitch: #6d6350; --verdigris: #86c9bb;
  }
}
body { margin: 0; background: var(--paper); color: var(--ink); font: 16px/1.5 'Noto Sans', sans-serif; }
.note { margin: 0; padding: 8px 16px; background: var(--manila); font-size: 14px; }
main { max-width: 760px; margin: 0 auto; padding: 16px; }
h1 { font-size: 26px; line-height: 1.25; margin: 16px 0; overflow-wrap: anywhere; }
h2 { font-size: 16px; margin: 24px 0 8px; }
a { color: var(--verdigris); overflow-wrap: anywhere; }
a:focus-visible { outline: 2px solid var(--verdigris); outline-offset: 2px; }
.mails { list-style: none; margin: 0; padding: 0; }
.mails li { border-bottom: 2px dashed var(--stitch); }
.mails a { display: grid; gap: 0 16px; padding: 12px 8px; text-decoration: none; color: inherit; }
.mails a:hover .subject { text-decoration: underline; }
.subject { font-weight: 600; color: var(--verdigris); overflow-wrap: anywhere; }
.to, time { color: var(--ink-soft); font-size: 14px; font-variant-numeric: tabular-nums; }
.mail { background: var(--card); border: 1px solid var(--stitch); border-radius: 4px; padding: 16px; }
dl { display: grid; grid-template-columns: auto 1fr; gap: 4px 16px; margin: 0; padding-bottom: 12px;
  border-bottom: 2px dashed var(--stitch); }
dt { color: var(--ink-soft); }
dd { margin: 0; overflow-wrap: anywhere; }
pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit; margin: 16px 0 0; }
iframe { width: 100%; height: 480px; border: 1px solid var(--stitch); background: #fff; }
`;

/** A letter of manila stock. */
export const icon = `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 16 16">
<rect x="1" y="3" width="14" height="10" rx="1" fill="#f0e3c4" stroke="#7a580f"/>
<path d="M1.5 4 8 9l6.5-5" fill="none" stroke="#7a580f"/></svg>`;

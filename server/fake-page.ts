import { escapeHtml } from './html.ts'

/** A page of the demo's local fakes: plain, and plainly not the desk. `body` is HTML. */
export function fakePage(title: string, body: string): string {
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(title)}</title>
<style>
  :root { color-scheme: light dark; --ink: light-dark(#1b2024, #ece9e1); --quiet: light-dark(#454b50, #c6c8c5);
    --sheet: light-dark(#ffffff, #1d2226); --hair: light-dark(#a5a6a3, #6d757b); --act: light-dark(#2b3a8c, #a9b6ff);
    --on: light-dark(#ffffff, #15191c); --bad: light-dark(#a1123c, #ff93aa) }
  * { box-sizing: border-box }
  body { margin: 0; background: light-dark(#e9e7e1, #15191c); color: var(--ink); font: 16px/24px system-ui, sans-serif }
  main { max-width: 760px; margin: 32px auto; padding: 24px; background: var(--sheet); border: 1px dashed var(--hair) }
  h1 { margin: 0 0 12px; font-size: 22px; line-height: 28px }
  p, dl { margin: 0 0 16px }
  .quiet { color: var(--quiet); font-size: 14px }
  .bad { color: var(--bad) }
  dl { display: grid; grid-template-columns: max-content 1fr; gap: 4px 20px }
  dd { margin: 0 }
  a { color: var(--act) }
  form { display: flex; flex-wrap: wrap; gap: 12px; margin: 0 0 16px }
  button { padding: 10px 18px; border: 1px solid var(--act); border-radius: 2px; background: none; color: var(--act);
    font: inherit; cursor: pointer }
  button.first { background: var(--act); color: var(--on) }
  table { width: 100%; border-collapse: collapse }
  th, td { padding: 8px 12px 8px 0; border-bottom: 1px solid var(--hair); text-align: left; vertical-align: top }
  pre { white-space: pre-wrap; overflow-wrap: anywhere; font-size: 14px }
  iframe { width: 100%; height: 640px; border: 1px solid var(--hair); background: #fff }
</style>
</head>
<body><main>${body}</main></body>
</html>
`
}

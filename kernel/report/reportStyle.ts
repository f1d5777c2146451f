/** Style of a report: light or dark as the reader's system is, and plain on paper. */
export const reportStyle = `<style>
:root{color-scheme:light dark;--ink:#1d2327;--paper:#fff;--quiet:#59646b;--line:#cfd6da;--panel:#f3f6f7;--accent:#0b5a78;--bad:#a3211a}
@media (prefers-color-scheme:dark){:root{--ink:#e3e8ea;--paper:#14191c;--quiet:#9aa7ae;--line:#38434a;--panel:#1d2429;--accent:#7cc4dc;--bad:#ff9a8f}}
body{font:16px/1.55 system-ui,"Segoe UI",Helvetica,Arial,sans-serif;color:var(--ink);background:var(--paper);max-width:52rem;margin:0 auto;padding:1.5rem 1.2rem 4rem}
header{border-bottom:3px solid var(--accent);padding-bottom:1rem;margin-bottom:1.5rem}
header h1{margin:.1rem 0 .6rem;font-size:1.7rem;line-height:1.25}
header .origin,header dl{color:var(--quiet);font-size:.9rem;margin:.2rem 0}
header dl{display:grid;grid-template-columns:max-content 1fr;gap:.15rem 1.2rem}
header dt{font-weight:600}header dd{margin:0;overflow-wrap:anywhere;font-variant-numeric:tabular-nums}
header dd code{color:var(--ink)}
h1,h2,h3{line-height:1.3}h2{margin-top:2.2rem;padding-bottom:.2rem;border-bottom:1px solid var(--line)}
a{color:var(--accent)}img,figure{max-width:100%}
code,pre{font-family:ui-monospace,"Cascadia Mono",Consolas,"Liberation Mono",monospace;font-size:.88em}
pre{white-space:pre-wrap;overflow-wrap:anywhere;background:var(--panel);padding:.6rem .8rem;border-radius:4px;margin:.5rem 0;max-height:40rem;overflow-y:auto}
pre.stderr,pre.error{border-left:4px solid var(--bad)}pre.error{color:var(--bad)}
.failure{border:2px solid var(--bad);border-radius:4px;padding:.4rem .8rem;margin:1rem 0}
.failure strong{color:var(--bad)}
details.code>summary{color:var(--quiet);font-size:.82rem;cursor:pointer}
.prose table{border-collapse:collapse}.prose th,.prose td{border-bottom:1px solid var(--line);padding:.2rem .8rem .2rem 0;text-align:left}
.cell{margin:.6rem 0 1.2rem}.output{overflow-x:auto}
.rb-figure img,.rb-figure .js-plotly-plot{border-radius:4px}
@media print{body{max-width:none;padding:0;font-size:11pt}details.code{display:none}pre{max-height:none}tr,figure{break-inside:avoid}h2,h3{break-after:avoid}}
</style>`;

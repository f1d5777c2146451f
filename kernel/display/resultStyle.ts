/**
 * Style of a result in a notebook page. Ink is the page's own, lines are a middle gray and the severity labels carry
 * their own ground, so a table reads on a light page and on a dark one, whoever made the page.
 */
export const resultStyle = `<style>
.rb-result{color:var(--jp-content-font-color1,inherit);font-size:.9em;line-height:1.4;max-width:60em}
.rb-result .rb-title{font-weight:600;font-size:1.1em;margin:.2em 0 .4em}
.rb-result .rb-cautions{list-style:none;margin:0 0 .6em;padding:0}
.rb-result .rb-cautions li{border-left:4px solid;padding:.15em .6em;margin:.25em 0}
.rb-result .rb-cautions b{font-size:.8em;letter-spacing:.05em;text-transform:uppercase;border-radius:3px;padding:.1em .45em;margin-right:.4em;color:#fff}
.rb-result .rb-stop{border-color:#b3261e!important}.rb-result .rb-stop b{background:#b3261e}
.rb-result .rb-check{border-color:#96610a!important}.rb-result .rb-check b{background:#96610a}
.rb-result .rb-note{border-color:#3a6291!important}.rb-result .rb-note b{background:#3a6291}
.rb-result .rb-source{opacity:.75}
.rb-result table.rb-table{border-collapse:collapse;margin:0 0 .8em;font-size:inherit;border:0;font-variant-numeric:tabular-nums}
.rb-result table.rb-table caption{caption-side:top;text-align:left;font-weight:600;padding:.2em 0;color:inherit}
.rb-result table.rb-table th,.rb-result table.rb-table td{border:0;border-bottom:1px solid rgba(128,128,128,.35);padding:.18em .8em .18em 0;text-align:left;vertical-align:top;font-weight:400;background:none}
.rb-result table.rb-table thead th{font-weight:600;border-bottom:2px solid rgba(128,128,128,.6);vertical-align:bottom}
.rb-result table.rb-table .rb-number{text-align:right;white-space:nowrap}
.rb-result table.rb-table tbody tr{background:none}
.rb-result .rb-unseen{position:absolute;width:1px;height:1px;overflow:hidden;clip-path:inset(50%)}
.rb-result details{opacity:.85}.rb-result details ul{margin:.2em 0;padding-left:1.4em}
.rb-figure{margin:0;overflow-x:auto}.rb-figure img{display:block;max-width:100%;height:auto}
</style>`;

/** The page's style: quiet, one accent, printable, dark scheme respected. */
export const style = `
:root{--ink:#16191d;--quiet:#59626c;--faint:#b9c0c7;--grid:#e6e9ec;--accent:#0a6a74;--band:#cfe3e4;--warm:#a4471c;--page:#fff}
@media (prefers-color-scheme:dark){:root{--ink:#e9ecef;--quiet:#a7b0b9;--faint:#5c656e;--grid:#2a3036;--accent:#5cc3cc;--band:#1d3f43;--warm:#f0a07c;--page:#14171a}}
*{box-sizing:border-box}
body{margin:0 auto;max-width:64rem;padding:2rem 1.25rem 5rem;background:var(--page);color:var(--ink);font:16px/1.55 system-ui,sans-serif}
h1{font-size:1.6rem;line-height:1.25;margin:0 0 .3rem}
h2{font-size:1.25rem;margin:3.2rem 0 .6rem;padding-top:1rem;border-top:1px solid var(--grid)}
h3{font-size:1rem;margin:1.6rem 0 .4rem}
p{max-width:46rem}
.lead{font-size:1.08rem}
.fine,figcaption,caption{color:var(--quiet);font-size:.9rem}
nav a{margin-right:1rem}
a{color:var(--accent)}
figure{margin:1.2rem 0;break-inside:avoid}
figure svg{max-width:100%;height:auto;display:block}
.wide{overflow-x:auto}
table{border-collapse:collapse;font-size:.9rem;min-width:100%}
caption{text-align:left;padding:.3rem 0}
th,td{text-align:left;padding:.32rem .7rem .32rem 0;border-bottom:1px solid var(--grid);vertical-align:top}
th{font-weight:600}
td.n,th.n{text-align:right;font-variant-numeric:tabular-nums;white-space:nowrap}
.law{overflow-x:auto;padding:.6rem 0;font:1.1rem/1.5 ui-monospace,monospace;overflow-wrap:anywhere}
.warnings{border-left:3px solid var(--warm);padding:.1rem 0 .1rem 1rem}
.warnings li{max-width:46rem}
.sign td{height:2.4rem;min-width:10rem}
:focus-visible{outline:2px solid var(--accent);outline-offset:2px}
@media print{body{max-width:none;padding:0;font-size:10.5pt}nav{display:none}thead{display:table-header-group}tr,figure{break-inside:avoid}h2,h3{break-after:avoid}.wide{overflow:visible}}
`;

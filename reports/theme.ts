/** The page's style: quiet, one accent, printable, dark scheme respected. */
export const style = `
:root{color-scheme:light dark;--ink:#16191d;--quiet:#59626c;--faint:#868f98;--grid:#e6e9ec;--accent:#0a6a74;--band:#cfe3e4;--warm:#a4471c;--page:#fff}
@media screen and (prefers-color-scheme:dark){:root{--ink:#e9ecef;--quiet:#a7b0b9;--faint:#7b848d;--grid:#2a3036;--accent:#5cc3cc;--band:#1d3f43;--warm:#f0a07c;--page:#14171a}}
*{box-sizing:border-box}
html{scroll-padding-top:4rem}
body{margin:0 auto;max-width:66rem;padding:2.5rem 1.5rem 6rem;background:var(--page);color:var(--ink);font:16px/1.55 system-ui,sans-serif;overflow-wrap:anywhere}
h1{font-size:1.7rem;line-height:1.25;margin:0 0 .3rem}
h2{font-size:1.3rem;line-height:1.3;margin:4rem 0 .7rem}
h3{font-size:1rem;margin:2rem 0 .4rem}
p,li{max-width:46rem}
.lead{font-size:1.1rem}
.fine,figcaption,caption{color:var(--quiet);font-size:.9rem}
nav ol{list-style:none;display:flex;flex-wrap:wrap;gap:.2rem 1.4rem;padding:0;margin:1rem 0 0}
a{color:var(--accent)}
figure{margin:1.8rem 0;max-width:100%}
figcaption{max-width:46rem;margin-top:.4rem}
.range{margin:.5rem 0}
.range figcaption{margin:0}
.range svg,.picture svg{display:block;max-width:100%;height:auto}
.pair{display:flex;flex-wrap:wrap;gap:0 2.5rem}
.half{flex:1 1 24rem;max-width:28rem}
.wide{overflow-x:auto;margin:1.4rem 0}
table{border-collapse:collapse;font-size:.9rem;line-height:1.4;min-width:min(100%,26rem)}
caption{text-align:left;padding:.3rem 0;caption-side:top}
th,td{text-align:left;padding:.34rem 1.1rem .34rem 0;border-bottom:1px solid var(--grid);vertical-align:baseline;min-width:3.5rem;max-width:24rem;overflow-wrap:break-word}
thead th{border-bottom-color:var(--faint);vertical-align:bottom}
th{font-weight:600}
th .fine,th .formula{font-weight:400}
.b{min-width:12rem}
td.n,th.n{text-align:right;font-variant-numeric:tabular-nums}
td.n{white-space:nowrap}
.formula,.hash{font-family:ui-monospace,monospace;font-size:.95em}
.hash{overflow-wrap:anywhere}
.law{overflow-x:auto;padding:.6rem 0}
math{font-size:1.35rem}
.warnings{border-left:3px solid var(--warm);padding:.1rem 0 .1rem 1.2rem;margin:1.6rem 0}
.warnings h3{margin-top:.4rem}
.notes{padding-left:1.2rem}
.sign td{height:2.6rem;min-width:min(11rem,24vw)}
details{margin:1.4rem 0}
summary{cursor:pointer;color:var(--accent)}
:focus-visible{outline:2px solid var(--accent);outline-offset:2px}
[hidden]{display:none!important}
.controls{position:sticky;top:0;z-index:2;margin:1.2rem -1.5rem 0;padding:.5rem 1.5rem;background:var(--page);border-bottom:1px solid var(--grid);max-height:45vh;overflow:auto}
.controls .row,.fields{display:flex;flex-wrap:wrap;gap:.5rem 1rem;align-items:center;margin:.5rem 0;padding:0;border:0}
legend{float:left;padding:0;margin-right:1rem;color:var(--quiet)}
input,button{font:inherit;color:inherit;background:var(--page);border:1px solid var(--faint);border-radius:3px;padding:.2rem .55rem}
input[type=checkbox]{accent-color:var(--accent);width:1.05rem;height:1.05rem;vertical-align:-.15rem}
button{cursor:pointer;min-height:1.9rem}
.pick,.sort{border:0;padding:0;font-weight:600;text-align:inherit;min-height:1.5rem;background:none}
.pick{color:var(--accent);text-decoration:underline}
[aria-sort=ascending] .sort::after{content:" ↑"}
[aria-sort=descending] .sort::after{content:" ↓"}
tr.picked>*{background:var(--band)}
.facts{display:flex;flex-wrap:wrap;gap:.1rem 1.2rem;margin:0;width:100%;max-height:9rem;overflow:auto;font-size:.9rem}
.facts div{display:flex;gap:.4rem}
.facts dt{color:var(--quiet)}
.facts dd{margin:0}
.tip{position:absolute;z-index:3;max-width:22rem;padding:.45rem .7rem;background:var(--page);color:var(--ink);border:1px solid var(--faint);border-radius:3px;font-size:.85rem;line-height:1.4;pointer-events:none}
.fields label{display:flex;flex-direction:column;gap:.2rem;max-width:15rem}
#calculator{margin-top:2.4rem}
#calculated p{margin:.2rem 0}
#calculated p:first-child{font-size:1.1rem}
#ledger-tools{margin-top:1.6rem}
.rows{overflow-x:auto}
@media (max-width:48rem){.rows svg{min-width:36rem}}
@media print{
:root{color-scheme:light}
@page{size:A4;margin:16mm 15mm}
body{max-width:none;padding:0;font-size:10pt}
h2{margin-top:9mm}
nav,.live,.controls{display:none!important}
thead{display:table-header-group}
tr,figure,.warnings,.sign{break-inside:avoid}
h2,h3,caption{break-after:avoid}
.lead{break-before:avoid}
.wide,.picture,.law{overflow:visible}
.wide table{font-size:8pt}
th,td{padding-right:.6rem;min-width:0}
td.n{white-space:normal}
details::details-content{content-visibility:visible}
a{color:inherit;text-decoration:none}
.half{flex:1 1 45%;max-width:48%}
}
`;

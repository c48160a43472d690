/** The look of the sheet: paper, ink, hairlines of two weights, brass, and one red that means danger and nothing else. */
export const SHEET_STYLE = `
:root{--paper:#fbf8f1;--ink:#1f1b16;--soft:#6d6558;--rule:#b9ae9a;--brass:#e6cd8f;--brass-edge:#6b5222;--danger:#a8201a;--slate:#3d5563}
*{box-sizing:border-box}
html{background:var(--paper);color:var(--ink);-webkit-text-size-adjust:100%}
body{margin:0 auto;max-width:190mm;padding:14mm 10mm 20mm;font:11.5pt/1.5 "Iowan Old Style","Palatino Linotype",Palatino,"Book Antiqua","URW Palladio L","P052",Georgia,serif;font-variant-numeric:tabular-nums lining-nums;hyphens:manual}
header{border-bottom:.3mm solid var(--ink);padding-bottom:4mm;margin-bottom:6mm}
h1{font-size:24pt;line-height:1.15;font-weight:500;margin:0 0 2mm;letter-spacing:.005em}
h2{font-size:13pt;font-weight:500;font-variant-caps:small-caps;letter-spacing:.06em;margin:11mm 0 2.5mm;border-top:.1mm solid var(--rule);padding-top:3mm}
p{margin:0 0 2.5mm;max-width:158mm}
.verdict{font-size:13.5pt;margin:3mm 0 0}
.danger{color:var(--danger)}
.soft{color:var(--soft)}
.mark{font-family:ui-monospace,"DejaVu Sans Mono",Menlo,Consolas,monospace;font-size:.9em;letter-spacing:.04em}
figure{margin:6mm 0 4mm;break-inside:avoid}
figure svg{display:block;max-width:100%;height:auto;margin:0 auto}
figcaption{font-size:10pt;color:var(--soft);text-align:center;margin-top:2mm}
figcaption b{color:var(--ink);font-weight:500;font-variant-caps:small-caps;letter-spacing:.05em}
.scroll{overflow-x:auto}
table{border-collapse:collapse;width:100%;font-size:10.5pt;break-inside:auto}
caption{text-align:left;color:var(--soft);font-size:10pt;padding-bottom:1.5mm}
th{font-weight:500;text-align:left;color:var(--soft);border-bottom:.2mm solid var(--ink);padding:1mm 2.5mm 1mm 0;vertical-align:bottom}
td{border-bottom:.1mm solid var(--rule);padding:1.1mm 2.5mm 1.1mm 0;vertical-align:top}
tr{break-inside:avoid}
.n{text-align:right;white-space:nowrap}
td.blank{min-width:24mm;border-bottom:.2mm solid var(--ink)}
ol,ul{margin:0 0 3mm;padding-left:6mm}
li{margin-bottom:1.3mm;max-width:158mm}
dl{margin:0 0 3mm;display:grid;grid-template-columns:max-content 1fr;gap:.8mm 5mm}
dt{color:var(--soft)}
dd{margin:0}
details summary{cursor:pointer;color:var(--soft)}
svg text{fill:var(--ink);font-family:inherit;stroke:none}
svg text.soft{fill:var(--soft)}
.metal{fill:var(--brass);stroke:var(--brass-edge)}
.left{fill:#c9a24e;stroke:none}
.cut{stroke:var(--brass-edge);fill:none}
.path{fill:none}
.rough{stroke:var(--soft)}
.fine{stroke:var(--slate)}
.cutter{fill:none;stroke:var(--ink)}
.construction{stroke:var(--soft);fill:none}
.dial path{stroke:var(--paper)}
.dial .chapter{fill:#8f8677}
.dial .other{fill:#c4bbab}
.dial .minutes{fill:none;stroke:var(--ink)}
.band{fill:#efe6d2}
.deviation{fill:none;stroke:var(--slate);stroke-width:.35}
.thin{fill:none;stroke:var(--ink);stroke-width:.12}
.dashed{stroke:var(--soft);stroke-dasharray:1 .8}
@media (max-width:640px){body{padding:6mm 4mm 12mm;font-size:12pt}h1{font-size:20pt}dl{grid-template-columns:1fr}dt{margin-top:1mm}}
@page{size:A4;margin:15mm 14mm 16mm}
@media print{html{background:none}body{padding:0;max-width:none;font-size:10pt}h2{break-after:avoid;margin-top:8mm}table{font-size:9pt}.scroll{overflow:visible}details{display:block}}
`;

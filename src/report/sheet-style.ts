/** The look of the sheet: paper, ink, hairlines of two weights, brass, and one red that means danger and nothing else. */
import { PLATE_STYLE } from './plate-style.ts';
import { FACE } from './stand-alone.ts';

const PAGE = `
*{box-sizing:border-box}
html{background:var(--paper);color:var(--ink);-webkit-text-size-adjust:100%;text-size-adjust:100%}
body{margin:0 auto;max-width:190mm;padding:14mm 10mm 20mm;font:11.5pt/1.5 ${FACE};font-variant-numeric:tabular-nums lining-nums;overflow-wrap:break-word}
header{border-bottom:.3mm solid var(--ink);padding-bottom:4mm;margin-bottom:5mm}
h1{font-size:25pt;line-height:1.15;font-weight:500;margin:0 0 3mm;text-wrap:balance}
h2{font-size:14pt;font-weight:500;font-variant-caps:small-caps;letter-spacing:.05em;margin:11mm 0 3mm;border-top:.1mm solid var(--rule);padding-top:3mm;break-after:avoid}
header+section h2:first-child{border-top:0;margin-top:0;padding-top:0}
h3{font-size:11.5pt;font-weight:500;font-style:italic;margin:6mm 0 1.5mm;break-after:avoid}
p{margin:0 0 2.5mm;max-width:160mm;text-wrap:pretty}
b{font-weight:600}
.what{font-size:12.5pt}
.verdict{font-size:13.5pt;line-height:1.4;margin:4mm 0 2.5mm}
.danger{color:var(--danger)}
.soft{color:var(--soft)}
.mark{font-family:ui-monospace,"DejaVu Sans Mono",Menlo,Consolas,monospace;font-size:.84em}
figure{margin:7mm 0 6mm;break-inside:avoid}
figure svg{display:block;max-width:100%;height:auto;margin:0 auto}
figcaption{font-size:10pt;line-height:1.45;color:var(--soft);margin:2.5mm auto 0;max-width:140mm;text-wrap:pretty}
figcaption b{color:var(--ink);font-weight:500;font-variant-caps:small-caps;letter-spacing:.04em;margin-right:.3em}
.scroll{overflow-x:auto;margin:3mm 0 4mm}
.whole{break-inside:avoid}
table{border-collapse:collapse;width:100%;font-size:10pt;line-height:1.35}
caption{text-align:left;font-style:italic;padding-bottom:1.5mm}
th{font-weight:500;text-align:left}
thead th{color:var(--soft);vertical-align:bottom}
thead th,thead td{border-bottom:.25mm solid var(--ink);padding:1mm 3mm 1mm 0}
tbody td,tbody th,tfoot td{border-bottom:.1mm solid var(--rule);padding:1.1mm 3mm 1.1mm 0;vertical-align:top}
tbody tr:last-child td,tbody tr:last-child th{border-bottom-color:var(--ink)}
tfoot td{border-bottom:0}
tr{break-inside:avoid}
thead{display:table-header-group}
tfoot{display:table-row-group}
.n,thead .n{text-align:right;white-space:nowrap}
.measures th{white-space:nowrap}
td.blank{min-width:26mm;border-bottom:.25mm solid var(--ink)}
tbody tr:last-child td.blank{border-bottom-color:var(--ink)}
.record .rule{display:inline-block;width:30mm;border-bottom:.1mm solid var(--ink);margin:0 2mm}
ol,ul{margin:0 0 3mm;padding-left:7mm}
li{margin-bottom:1.4mm;max-width:160mm;text-wrap:pretty;break-inside:avoid}
.columns{columns:2;column-gap:9mm;font-size:10pt;line-height:1.4}
.whys{margin:0 0 3mm;display:grid;grid-template-columns:max-content 1fr;gap:1mm 4mm;font-size:10pt;line-height:1.4}
dt{white-space:nowrap;min-width:14mm}
dt,dd{break-inside:avoid}
dd{margin:0}
footer{border-top:.1mm solid var(--rule);margin-top:11mm;padding-top:2mm;font-size:10pt}
@media screen and (max-width:640px){body{padding:6mm 4mm 12mm}h1{font-size:20pt}.columns{columns:1}.plate text{font-size:1.3em}.plate .legend,.plate .minute{font-size:1em}}
@page{size:A4;margin:14mm 14mm 15mm}
@media print{:root{--paper:#fff}body{padding:0;max-width:none;font-size:10pt}h1{font-size:21pt}.what{font-size:11pt}.verdict{font-size:12pt}h2{margin-top:7mm}h3{font-size:10pt}table,figcaption,.columns,.whys{font-size:9pt}.scroll{overflow:visible}figure{margin:4mm 0 5mm}*{print-color-adjust:exact;-webkit-print-color-adjust:exact}}
`.replaceAll('\n', '');

export const SHEET_STYLE = PLATE_STYLE + PAGE;

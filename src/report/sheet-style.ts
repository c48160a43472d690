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
.pair{display:flex;gap:4mm;justify-content:space-between;align-items:flex-start;break-inside:avoid}
.pair figure{min-width:0;flex:1 1 96mm}
.pair .plate-deviation{flex:1 1 82mm}
.pair figcaption{margin-left:0}
figure svg{display:block;max-width:100%;height:auto;margin:0 auto}
figcaption{font-size:10pt;line-height:1.45;color:var(--soft);margin:2.5mm auto 0;max-width:140mm;text-wrap:pretty}
figcaption b{color:var(--ink);font-weight:500;font-variant-caps:small-caps;letter-spacing:.04em;margin-right:.3em}
.note{font-size:10pt}
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
.whys,.taken{margin:0 0 3mm;columns:2;column-gap:9mm;font-size:10pt;line-height:1.4}
.whys div,.taken div{break-inside:avoid;padding:.6mm 0 .6mm 4mm;text-indent:-4mm}
.whys dt,.whys dd,.taken dt,.taken dd{display:inline;margin:0}
.whys dt{color:var(--soft);margin-right:.4em}
.taken dd{color:var(--soft)}
:focus-visible{outline:.5mm solid var(--slate);outline-offset:1mm}
footer{border-top:.1mm solid var(--rule);margin-top:11mm;padding-top:2mm;font-size:10pt}
@media screen and (max-width:640px){body{padding:6mm 4mm 12mm}h1{font-size:20pt}.columns,.whys,.taken{columns:1}.plate text{font-size:1.25em}.plate .legend,.plate .minute,.plate-space text,.plate-deviation text{font-size:1em}.plate-table text{font-size:1.05em}.pair{display:block}.pair figure{margin:7mm auto 6mm}.measures thead th{border:0;padding-bottom:0}.measures thead th:last-child{display:none}.measures tr{display:grid;grid-template-columns:1fr auto 20mm;column-gap:3mm}.measures tbody tr{border-bottom:.1mm solid var(--rule);padding:1.5mm 0}.measures tbody tr>*{border:0;padding:.6mm 0}.measures tbody td.blank{min-width:0;border-bottom:.25mm solid var(--ink)}.measures tbody td:last-child{grid-column:1/-1}}
@page{size:A4;margin:11mm 14mm 11mm}
@media print{td.blank{min-width:22mm}:root{--paper:#fff}body{padding:0;max-width:none;font-size:9.5pt;line-height:1.4}header{padding-bottom:2mm;margin-bottom:2mm}h1{font-size:20pt;margin-bottom:2mm}.what{font-size:11pt}.verdict{font-size:12pt;margin:2mm 0 1.5mm}p{margin-bottom:1.5mm;max-width:none}li{max-width:none;margin-bottom:.9mm}h2{margin:5mm 0 2mm;padding-top:2mm}h3{font-size:9.5pt;margin-top:3mm}table,figcaption,.note{font-size:8.5pt}.columns,.whys,.taken{font-size:8.5pt;line-height:1.35}.columns{line-height:1.3}.taken{font-size:8pt;line-height:1.3}.taken div{padding:.3mm 0 .3mm 4mm}.columns li{margin-bottom:.6mm}tbody td,tbody th,tfoot td{padding-top:.7mm;padding-bottom:.7mm}.scroll{overflow:visible;margin:1.5mm 0 2mm}figure{margin:3mm 0 3mm}figcaption{margin-top:1.5mm;max-width:160mm}footer{margin-top:4mm;break-before:avoid}*{print-color-adjust:exact;-webkit-print-color-adjust:exact}}
`.replaceAll('\n', '');

export const SHEET_STYLE = PLATE_STYLE + PAGE;

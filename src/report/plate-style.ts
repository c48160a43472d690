/** The look of the plates: ink, hairlines, brass, and one red that means danger and nothing else. */
export const PLATE_STYLE = `
:root{--paper:#fbf8f1;--ink:#1f1b16;--soft:#665e51;--rule:#b9ae9a;--brass:#e2c680;--brass-edge:#5f481c;--stock:#f1e6cb;--danger:#a8201a;--slate:#2f4d63}
svg text{fill:var(--ink);stroke:none;font-family:inherit;font-variant-numeric:tabular-nums lining-nums}
svg .halo{paint-order:stroke;stroke:var(--paper);stroke-width:.9;stroke-linejoin:round}
svg .soft{fill:var(--soft)}
.metal{fill:var(--brass);stroke:var(--brass-edge)}
.stock{fill:var(--stock);stroke:none}
.channel{fill:none;stroke:var(--paper);stroke-linecap:round}
.way .rough{stroke:var(--soft)}
.way .fine{stroke:var(--slate)}
.axis{fill:none;stroke:var(--soft)}
.line{fill:none;stroke:var(--ink)}
.arrow{fill:var(--ink);stroke:none}
.extension{fill:none;stroke:var(--soft)}
.jaw{fill:var(--paper);stroke:var(--ink)}
.brass{fill:var(--brass);stroke:none}
.far{fill:var(--stock)}
.edge{fill:none;stroke:var(--brass-edge)}
.hatched{fill:url(#hatch);stroke:var(--brass-edge)}
.hatching{fill:none;stroke:var(--brass-edge)}
.left-metal{fill:#b98f3a;stroke:none}
.cut{fill:none;stroke:var(--brass-edge)}
.cutter{fill:none;stroke:var(--ink)}
.chapter{stroke:var(--paper);stroke-width:.3}
.rough-tint{fill:#d9d0be}
.fine-tint{fill:#b4c3cd}
.minute{font-size:.85em}
.band{fill:#efe6d2}
.deviation{fill:none;stroke:var(--slate);stroke-width:.35}
.fine-arrow{fill:var(--slate)}
.solid{fill:url(#solid);stroke:var(--ink)}
.plate-metal{fill:#dcd5c6;stroke:none}
.zero{fill:var(--paper);stroke:var(--ink);stroke-width:.3}
.edged{stroke:var(--brass-edge)}
.dashed{stroke-dasharray:1 .8}
.danger-ring{fill:none;stroke:var(--danger)}
`.replaceAll('\n', '');

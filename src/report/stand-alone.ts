/** A plate as a file of its own: title, look and paper inside it. */
import { PLATE_STYLE } from './plate-style.ts';
import { escapeText } from './words.ts';

export function standAlone(svg: string, title: string): string {
  const at = svg.indexOf('>') + 1;
  return `${svg.slice(0, at)}<title>${escapeText(title)}</title><style>${PLATE_STYLE}svg{background:var(--paper);font-family:${FACE}}</style>${svg.slice(at)}\n`;
}

export const FACE =
  '"Iowan Old Style","Palatino Linotype",Palatino,"Book Antiqua","URW Palladio L",P052,"TeX Gyre Pagella",Georgia,serif';

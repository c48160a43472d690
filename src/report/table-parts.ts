/** Parts of the sheet's tables: heads of columns, and a frame that scrolls sideways on a narrow screen, by the keyboard too. */

/** Heads of columns; those of `figures` stand to the right. */
export function head(names: readonly string[], figures: readonly number[]): string {
  return names
    .map((name, i) =>
      name === '' ? '<td></td>' : `<th scope="col"${figures.includes(i) ? ' class="n"' : ''}>${name}</th>`,
    )
    .join('');
}

/** Opens the frame; `kind` adds a class: `whole` stays on one page of paper. */
export function scroll(name: string, kind = ''): string {
  return `<div class="scroll${kind === '' ? '' : ` ${kind}`}" tabindex="0" role="region" aria-label="Table of ${name}">`;
}

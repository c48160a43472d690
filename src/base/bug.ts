/** The one error class: something that cannot happen has happened, and the fault is ours. */
export class Bug extends Error {
  override readonly name = 'Bug';
}

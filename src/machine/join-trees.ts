/** Trees laid over each other, later ones on top: groups are joined key by key, lists and values replaced. */
export function joinTrees(trees: readonly unknown[]): unknown {
  return trees.reduce((under, over) => laidOver(under, over));
}

function laidOver(under: unknown, over: unknown): unknown {
  if (!isGroup(under) || !isGroup(over)) {
    return over;
  }
  const joined: Record<string, unknown> = { ...under };
  for (const [key, value] of Object.entries(over)) {
    joined[key] = Object.hasOwn(joined, key) ? laidOver(joined[key], value) : value;
  }
  return joined;
}

function isGroup(tree: unknown): tree is Record<string, unknown> {
  return typeof tree === 'object' && tree !== null && !Array.isArray(tree);
}

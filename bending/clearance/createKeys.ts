/** Gives one and the same object for the same row of parts, so that answers can be found by it; parts are compared as Map keys are. */
export function createKeys(): (...parts: readonly unknown[]) => object {
  interface Node { readonly next: Map<unknown, Node> }
  const root: Node = { next: new Map() };
  return (...parts) => {
    let node = root;
    for (const part of parts) {
      let following = node.next.get(part);
      if (!following) {
        following = { next: new Map() };
        node.next.set(part, following);
      }
      node = following;
    }
    return node;
  };
}

/** As much of the tree of HTML nodes as is walked here. */
export interface MarkNode {
  type: string;
  tagName?: string;
  value?: string;
  properties?: Record<string, unknown>;
  children?: MarkNode[];
}

/** A text cut into plain words and things that are drawn in their place, such as residue labels. */
export type Linkify<Drawn> = (text: string) => readonly (string | Drawn)[];

const untouched = new Set(['code', 'pre', 'a', 'script', 'style']);

/**
 * Replaces what `linkify` finds in the texts of a tree by numbered places, and gives what belongs there in order.
 * Code, preformatted text and links stay as they were written.
 */
export function placeParts<Drawn>(tree: MarkNode, linkify: Linkify<Drawn>): Drawn[] {
  const drawn: Drawn[] = [];
  const place = (node: MarkNode): MarkNode[] => {
    if (node.type === 'text') {
      return linkify(node.value ?? '').map((part) => {
        if (typeof part === 'string') return { type: 'text', value: part };
        drawn.push(part);
        return { type: 'element', tagName: 'span', properties: { dataPart: drawn.length - 1 }, children: [] };
      });
    }
    if (node.children && !untouched.has(node.tagName ?? '')) node.children = node.children.flatMap(place);
    return [node];
  };
  place(tree);
  return drawn;
}

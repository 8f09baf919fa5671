/** A label wants to stand level with what it names; `height` is what it takes up. */
export type LabelBox = {
  readonly id: string;
  readonly wantY: number;
  readonly height: number;
  /** May be left out when there is no room; the words below the sheet still say it. */
  readonly optional?: boolean;
};
export type PlacedLabel = { readonly id: string; readonly y: number };
export type Placement = { readonly placed: readonly PlacedLabel[]; readonly left: readonly string[] };

type Block = { items: LabelBox[]; wanted: number; y: number };

/**
 * Places labels in one column so that none overlap, in the order of what they name (so that leaders do not cross),
 * each as near to its wish as the others allow: neighbours that would collide become one block which stands at the
 * mean of its wishes (least squares, pool adjacent violators). `y` is the top of a label.
 */
export function placeLabels(
  labels: readonly LabelBox[],
  room: { readonly top: number; readonly bottom: number; readonly gap: number },
): Placement {
  const { kept, left } = keepWhatFits(labels, room);
  const gap = Math.min(room.gap, spareGap(kept, room));
  const blocks: Block[] = [];
  for (const label of kept.toSorted((a, b) => a.wantY - b.wantY)) {
    let block: Block = { items: [label], wanted: label.wantY - label.height / 2, y: 0 };
    block.y = within(block, room, gap);
    for (let before = blocks.at(-1); before && before.y + blockHeight(before, gap) + gap > block.y;) {
      blocks.pop();
      block = joined(before, block, gap);
      block.y = within(block, room, gap);
      before = blocks.at(-1);
    }
    blocks.push(block);
  }
  const placed: PlacedLabel[] = [];
  for (const block of blocks) {
    let y = block.y;
    for (const item of block.items) {
      placed.push({ id: item.id, y });
      y += item.height + gap;
    }
  }
  return { placed, left };
}

function blockHeight(block: Block, gap: number): number {
  return block.items.reduce((sum, item) => sum + item.height, 0) + gap * (block.items.length - 1);
}

/** Top of the joined block as the mean of what each of its items wishes of it. */
function joined(first: Block, second: Block, gap: number): Block {
  const shift = blockHeight(first, gap) + gap;
  const n1 = first.items.length;
  const n2 = second.items.length;
  const wanted = (first.wanted * n1 + (second.wanted - shift) * n2) / (n1 + n2);
  return { items: [...first.items, ...second.items], wanted, y: wanted };
}

function within(block: Block, room: { top: number; bottom: number }, gap: number): number {
  return Math.max(room.top, Math.min(block.wanted, room.bottom - blockHeight(block, gap)));
}

function total(labels: readonly LabelBox[]): number {
  return labels.reduce((sum, label) => sum + label.height, 0);
}

const LEAST_GAP = 2;

function keepWhatFits(labels: readonly LabelBox[], room: { top: number; bottom: number }) {
  const kept = [...labels];
  const left: string[] = [];
  while (kept.length > 0 && total(kept) + LEAST_GAP * (kept.length - 1) > room.bottom - room.top) {
    const optional = kept.findLastIndex((label) => label.optional);
    const [gone] = kept.splice(optional === -1 ? kept.length - 1 : optional, 1);
    if (gone) left.push(gone.id);
  }
  return { kept, left };
}

function spareGap(labels: readonly LabelBox[], room: { top: number; bottom: number }): number {
  if (labels.length < 2) return Number.POSITIVE_INFINITY;
  return (room.bottom - room.top - total(labels)) / (labels.length - 1);
}

export interface LabelWish {
  /** Where the label would best be centred. */
  centre: number;
  width: number;
}

export interface PlacedLabel {
  centre: number;
  /** 0 is the lane next to the drawing; higher lanes lie further out. */
  lane: number;
}

/**
 * Puts labels in the lowest lane where they overlap none, left to right, kept within 0 … `length`.
 * Wishes must be sorted by centre.
 */
export function placeLabels(wishes: LabelWish[], length: number, gap = 6): PlacedLabel[] {
  const ends: number[] = [];
  return wishes.map(({ centre, width }) => {
    const kept = Math.min(Math.max(centre, width / 2), Math.max(width / 2, length - width / 2));
    const start = kept - width / 2;
    const free = ends.findIndex((end) => end + gap <= start);
    const lane = free === -1 ? ends.length : free;
    ends[lane] = start + width;
    return { centre: kept, lane };
  });
}

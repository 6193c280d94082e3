import { View } from 'react-native';
import type { LaminateNote, StudyResult } from '../../../../shared/contract/studies';
import { DataTable, Figure, Sheet, Small } from '../../../ui';
import { sideBySideRows, type CellWords, type SideBySideRow } from '../side-by-side';
import { useFigures } from '../use-figures';

export interface SideBySideSheetProps {
  result: StudyResult;
  notes: LaminateNote[];
}

/** The walls of a study in one table, with what was said of each. */
export function SideBySideSheet({ result, notes }: SideBySideSheetProps) {
  const show = useFigures();
  // A result from before trays came in has no such field.
  const { tray }: Partial<StudyResult['pack']> = result.pack;
  const rows = sideBySideRows(result.candidates, { targetDays: result.target_days, notes, show });
  return (
    <Sheet title="Side by side" subtitle="Per pack: the film cut for it, not what leaves the mill.">
      <DataTable
        caption="Every wall of this study"
        isCaptionHidden
        columns={[
          { key: 'wall', title: 'Wall' },
          { key: 'days', title: 'Days', kind: 'figure' },
          { key: 'ends', title: 'Ends by' },
          { key: 'price', title: 'Price per pack', kind: 'figure' },
          { key: 'mass', title: 'Mass per pack', kind: 'figure' },
          { key: 'ultraviolet', title: 'UV passed', unit: '350 nm', kind: 'figure' },
          { key: 'visible', title: 'Visible light passed', unit: '550 nm', kind: 'figure' },
          { key: 'family', title: 'Largest polymer family', unit: 'share of the mass', kind: 'figure' },
        ]}
        rows={rows.map((row) => ({
          id: row.id,
          wall: <WallCell row={row} />,
          days: row.days,
          ends: row.ends,
          price: <Cell words={row.price} />,
          mass: <Cell words={row.mass} />,
          ultraviolet: <Cell words={row.ultraviolet} />,
          visible: <Cell words={row.visible} />,
          family: <Cell words={row.family} />,
        }))}
      />
      {tray === null || tray === undefined ? null : (
        <Small tone="third">{`Price, mass and polymer family count the tray (${tray.name}) with its lid; light is that of the lid.`}</Small>
      )}
    </Sheet>
  );
}

function WallCell({ row }: { row: SideBySideRow }) {
  return (
    <View style={{ minWidth: 0 }}>
      <Small tone="ink" weight="medium">
        {row.wall}
      </Small>
      {row.verdict === '' ? null : <Small tone="ink">{row.verdict}</Small>}
      {row.note === '' ? null : <Small>{row.note}</Small>}
    </View>
  );
}

function Cell({ words }: { words: CellWords }) {
  return (
    <View style={{ alignItems: 'flex-end', minWidth: 0 }}>
      <Figure value={words.figures} size="small" />
      {words.missing === '' ? null : (
        <Small tone="third" align="right">
          {words.missing}
        </Small>
      )}
    </View>
  );
}

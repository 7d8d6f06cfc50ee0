import type { FrameSheetView } from '@linkfell/contracts';
import { Disclosure } from '../../../components/disclosure';
import { SpecTable } from '../../../components/spec-table';

const sourceWords = (source: { label: string; date: string | null } | null): string | undefined =>
  source ? `${source.label}${source.date ? `, ${source.date}` : ''}` : undefined;

/** What the frame sheet says, each figure with its source. */
export function SheetFigures({ sheet }: { sheet: FrameSheetView }) {
  return (
    <Disclosure summary={`What the frame sheet says (version ${sheet.version})`}>
      <SpecTable
        caption={`${sheet.frame.makerName} ${sheet.frame.model}`}
        rows={[
          ...sheet.entries.flatMap((entry) => [
            {
              label: entry.chip ? `Shock size, chip ${entry.chip}` : 'Shock size',
              value: entry.sizeKey,
              unit: 'mm',
              source: sourceWords(entry.source),
            },
            { label: 'Frame end', value: entry.frameEnd },
            { label: 'Link end', value: entry.linkEnd },
          ]),
          ...sheet.figures.map((figure) => ({
            label: figure.label,
            value: figure.text,
            source: sourceWords(figure.source),
          })),
        ]}
      />
    </Disclosure>
  );
}

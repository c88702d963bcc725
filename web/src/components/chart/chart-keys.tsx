import { Button } from '../button.tsx';

interface ChartKeysProps {
  readonly asTable: boolean;
  readonly onTable: (asTable: boolean) => void;
  readonly onPicture: () => void;
  readonly onNumbers: () => void;
}

/** What every chart can also be: a table, a picture, a file of numbers. */
export function ChartKeys({ asTable, onTable, onPicture, onNumbers }: ChartKeysProps) {
  return (
    <div className="flex flex-wrap gap-x-4 text-small print:hidden">
      <Button
        look="quiet"
        className="text-small"
        aria-pressed={asTable}
        onClick={() => {
          onTable(!asTable);
        }}
      >
        {asTable ? 'Show as chart' : 'Show as table'}
      </Button>
      {!asTable && (
        <Button look="quiet" className="text-small" onClick={onPicture}>
          Save picture
        </Button>
      )}
      <Button look="quiet" className="text-small" onClick={onNumbers}>
        Save numbers (CSV)
      </Button>
    </div>
  );
}

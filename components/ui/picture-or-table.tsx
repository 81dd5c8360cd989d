'use client';

import { useId, useState } from 'react';
import { Button } from './button';
import { Table } from './table';

export type FigureTable = { columns: readonly string[]; rows: readonly (readonly React.ReactNode[])[] };

export type PictureOrTableProps = {
  /** The figure in one sentence; stands above the table and names the picture. */
  sentence: string;
  picture: React.ReactNode;
  table: FigureTable;
  seeTable: string;
  seePicture: string;
  className?: string;
};

/** A drawn figure with its sentence, and the same figures as a table one press away. */
export function PictureOrTable({ sentence, picture, table, seeTable, seePicture, className }: PictureOrTableProps) {
  const [asTable, setAsTable] = useState(false);
  const sentenceId = useId();
  return (
    <figure className={className} aria-labelledby={sentenceId}>
      <figcaption id={sentenceId} className="sr-only">
        {sentence}
      </figcaption>
      {asTable ? (
        <Table caption={sentence} columns={table.columns} rows={table.rows.map((cells, key) => ({ key, cells }))} />
      ) : (
        picture
      )}
      <Button
        variant="quiet"
        size="small"
        className="-ml-1.5"
        aria-pressed={asTable}
        onClick={() => setAsTable(!asTable)}
      >
        {asTable ? seePicture : seeTable}
      </Button>
    </figure>
  );
}

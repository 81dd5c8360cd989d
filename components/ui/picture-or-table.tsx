'use client';

import { useId, useState } from 'react';
import { Button } from './button';

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
      {asTable ? <FigureAsTable sentence={sentence} table={table} /> : picture}
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

function FigureAsTable({ sentence, table }: { sentence: string; table: FigureTable }) {
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={sentence}>
      <table className="w-full border-collapse text-left text-small">
        <thead>
          <tr className="border-b border-ink">
            {table.columns.map((column) => (
              <th key={column} scope="col" className="py-2 pr-4 align-bottom font-strong">
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {table.rows.map((row, rowIndex) => (
            <tr key={rowIndex} className="border-b border-rule">
              {row.map((cell, cellIndex) =>
                cellIndex === 0 ? (
                  <th key={cellIndex} scope="row" className="py-2 pr-4 font-emphasis">
                    {cell}
                  </th>
                ) : (
                  <td key={cellIndex} className="py-2 pr-4">
                    {cell}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

export type TableProps = {
  caption: string;
  columns: readonly string[];
  rows: readonly { key: string | number; cells: readonly React.ReactNode[] }[];
};

/** Figures in rows: the first cell names its row. Scrolls within itself and can be reached by keyboard. */
export function Table({ caption, columns, rows }: TableProps) {
  return (
    <div role="region" aria-label={caption} tabIndex={0} className="max-h-96 overflow-auto border-y border-rule-2">
      <table className="w-full border-collapse text-left text-small">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th
                key={column}
                scope="col"
                className="sticky top-0 border-b border-ink bg-paper py-1.5 pr-4 align-bottom font-strong"
              >
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ key, cells: [name, ...cells] }) => (
            <tr key={key} className="border-b border-rule">
              <th scope="row" className="py-1 pr-4 font-emphasis whitespace-nowrap">
                {name}
              </th>
              {cells.map((cell, index) => (
                <td key={index} className="py-1 pr-4">
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

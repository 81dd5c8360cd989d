/** What the server knew when it made the page, for a query; nothing where it could not say, and then the browser asks. */
export function fromPage<Data>(initial: Data | undefined): { initialData?: Data } {
  return initial === undefined ? {} : { initialData: initial };
}

import common from './en/common.json';

/** Every word of the product, one namespace a file. A new file is added here and is then typed and served everywhere. */
export const catalogue = { common };

export type Catalogue = typeof catalogue;
export type Namespace = keyof Catalogue;

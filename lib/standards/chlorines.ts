/** Substances that put available chlorine into the water. */
export const chlorines: readonly string[] = ['trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite'];

/**
 * Runs once the style sheet is there and before the body is read: text laid out before its faces are ready is laid out twice,
 * and the first time in a face of the device's own, which takes longer to find than the whole page to lay out.
 */
export const earlyFontsScript = `
for (const family of ['Fraunces Variable', 'Atkinson Hyperlegible Next Variable'])
  document.fonts.load('1em "' + family + '"').catch(() => undefined);
`;

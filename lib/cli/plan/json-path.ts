/** Where a value stands, as people write it: `shelf.0.strength` becomes `$.shelf[0].strength`. */
export function jsonPath(path: string): string {
  const steps = path.split('.').filter((step) => step !== '');
  return `$${steps.map((step) => (/^\d+$/.test(step) ? `[${step}]` : `.${step}`)).join('')}`;
}

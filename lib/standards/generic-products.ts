/**
 * What a shop sells, where the shelf has no product: usual strengths as printed on labels, usual measures, prices where the
 * household named none [per kg, per litre]. A dose of these is marked to buy. Strength as the substance counts it: %
 * available chlorine, trade % of liquid, % by weight of the rest.
 */
export const genericProducts = {
  trichlor: { id: 'generic-trichlor', form: 'tablet', strength: 90, tabletMass: 227, pricePerKg: 9 },
  dichlor: { id: 'generic-dichlor', form: 'granular', strength: 55, measure: 50, pricePerKg: 9 },
  'calcium-hypochlorite': {
    id: 'generic-calcium-hypochlorite',
    form: 'granular',
    strength: 65,
    labelWay: 'dissolve',
    measure: 50,
    pricePerKg: 8,
  },
  'sodium-hypochlorite': {
    id: 'generic-sodium-hypochlorite',
    form: 'liquid',
    strength: 12.5,
    measure: 250,
    pricePerLitre: 1.5,
  },
  'hydrochloric-acid': { id: 'generic-hydrochloric-acid', form: 'liquid', strength: 31.45, pricePerLitre: 3 },
  'sodium-bisulfate': { id: 'generic-sodium-bisulfate', form: 'other', strength: 93, pricePerKg: 4 },
  'sodium-bicarbonate': { id: 'generic-sodium-bicarbonate', form: 'other', strength: 100, pricePerKg: 3 },
  'sodium-carbonate': { id: 'generic-sodium-carbonate', form: 'other', strength: 100, pricePerKg: 4 },
  'calcium-chloride': { id: 'generic-calcium-chloride', form: 'other', strength: 77, pricePerKg: 3 },
  'cyanuric-acid': { id: 'generic-cyanuric-acid', form: 'other', strength: 100, pricePerKg: 10 },
  'sodium-thiosulfate': { id: 'generic-sodium-thiosulfate', form: 'other', strength: 100, pricePerKg: 10 },
} as const;

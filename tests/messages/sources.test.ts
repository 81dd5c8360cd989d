import { expect, it } from 'vitest';
import { constantGroups, type ListedConstant } from '@/lib/client/worked-out/constants';
import { sourceIn, translatedSources } from '@/lib/messages/source-words';

/** Printed as it stands on the paper, in every language. */
const citations = [
  'Anne Arundel County, Maryland, pool rules',
  'CDC Model Aquatic Health Code 2023',
  'California Title 22, sections 65523 and 65529',
  'Falk, Blatchley, Kuechler, Meyer, Pickens, Suppes 2019, Water 11(6):1314',
  'Florida 64E-9.004',
  'Montana ARM 37.115.1308, Table 6',
  'Pima County, Arizona, section 8.32.080',
  'US National Lightning Safety Institute, section 4.7, pools',
];

const said = new Set(
  constantGroups
    .flatMap((group) => [group.source, ...group.constants.map(({ source }: ListedConstant) => source)])
    .flatMap((source) => (typeof source === 'object' ? [source.text] : [])),
);

it('has every source that says more than a title', () => {
  expect([...said].filter((text) => !citations.includes(text) && sourceIn('es', text) === text)).toEqual([]);
});

it('translates nothing that no source says', () => {
  expect(translatedSources.filter((text) => !said.has(text))).toEqual([]);
});

it('leaves titles as they are printed, and English as it is written', () => {
  for (const text of citations) expect(sourceIn('es-ES', text)).toBe(text);
  for (const text of said) expect(sourceIn('en-US', text)).toBe(text);
});

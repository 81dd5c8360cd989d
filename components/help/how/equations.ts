import type { Catalogue } from '@/lib/messages/english';
import type { HowPage } from '@/lib/client/worked-out/how-page';
import { numbersInEquations } from '@/lib/client/worked-out/numbers-in-equations';

export type Term = { sign?: '=' | '+' | '−' | '×' | '/'; word: keyof Catalogue['how']['term']; symbol: string };
export type Equation = { terms: readonly Term[]; further?: readonly string[] };

const n = numbersInEquations;

/** The equation of each page: its terms in words and in symbols, and what stands beside it. */
export const equations: Readonly<Record<HowPage, Equation>> = {
  'free-chlorine': {
    terms: [
      { word: 'hourFromNow', symbol: '*C*′' },
      { sign: '=', word: 'thereNow', symbol: '*C*' },
      { sign: '+', word: 'dose', symbol: '*d* / *V*' },
      { sign: '+', word: 'feeder', symbol: '*r* / *V*' },
      { sign: '−', word: 'waterUses', symbol: '*k*{_D}(*T*) *C*' },
      { sign: '−', word: 'sunTakes', symbol: '*S* *D* Σ *k*{_i} *C*{_i}' },
      { sign: '−', word: 'swimmersUse', symbol: '*n* *b* / *V*' },
    ],
    further: [`*k*{_D}(*T*) = *k*{_D} 2{^(*T* − ${n.darkDemandAt}) / 10}`],
  },
  'chlorine-forms': {
    terms: [
      { word: 'free', symbol: '*C*' },
      { sign: '=', word: 'active', symbol: '[HOCl]' },
      { sign: '+', word: 'slow', symbol: '[OCl{^−}]' },
      { sign: '+', word: 'reserve', symbol: 'Σ *n* [Cl{_n}Cy]' },
    ],
    further: ['[OCl{^−}] = *K* [HOCl] / [H{^+}]', 'Cy = Σ [Cl{_n}Cy], *n* = 0, 1, 2, 3'],
  },
  stabilizer: {
    terms: [
      { word: 'lowest', symbol: '*L*' },
      { sign: '=', word: 'larger', symbol: 'max' },
      { word: 'minimum', symbol: '*m*' },
      { word: 'share', symbol: `*S* / ${n.stabilizerPerLowestLevel}` },
    ],
    further: [`*m* = ${n.minimumStabilized}, {=or} ${n.minimumUnstabilized} {=withoutStabilizer}`],
  },
  sun: {
    terms: [
      { word: 'sunlight', symbol: '*S* *D*' },
      { sign: '=', word: 'place', symbol: '*λ*' },
      { sign: '×', word: 'sky', symbol: '*q*' },
      { sign: '×', word: 'height', symbol: `(sin *e* / sin ${n.referenceElevation}°){^${n.ultravioletExponent}}` },
      { sign: '×', word: 'through', symbol: '(1 − e{^−*K* *d*}) / (*K* *d*)' },
    ],
    further: ['{=loss} = *S* *D* (*k*{_H} [HOCl] + *k*{_O} [OCl{^−}] + *k*{_B} [{=bound}])'],
  },
  tablets: {
    terms: [
      { word: 'leftOfTablet', symbol: '*m* / *m*{_0}' },
      { sign: '=', word: 'narrower', symbol: '(1 − *s* / 3){^2}' },
      { sign: '×', word: 'thinner', symbol: '(1 − *s*)' },
    ],
    further: ['*s* = {=runningHours} / {=life}'],
  },
  swimmers: {
    terms: [
      { word: 'fall', symbol: 'Δ*C*' },
      { sign: '=', word: 'heads', symbol: '*n*' },
      { sign: '×', word: 'hours', symbol: '*t*' },
      { sign: '×', word: 'grams', symbol: '*b*' },
      { sign: '/', word: 'spread', symbol: '*V*' },
    ],
  },
  'combined-chlorine': {
    terms: [
      { word: 'growth', symbol: 'd*B* / d*t*' },
      { sign: '=', word: 'made', symbol: `${n.becomingCombined} *n* *b* / *V*` },
      { sign: '−', word: 'fades', symbol: '*k* *B*' },
    ],
  },
  ph: {
    terms: [
      { word: 'alkalinity', symbol: '*A*' },
      {
        sign: '=',
        word: 'carbonatePart',
        symbol: '[HCO{_3}{^−}] + 2[CO{_3}{^2−}] + [CaHCO{_3}{^+}] + 2[CaCO{_3}]',
      },
      { sign: '+', word: 'waterPart', symbol: '[OH{^−}] − [H{^+}]' },
      { sign: '+', word: 'chlorinePart', symbol: '[OCl{^−}]' },
      {
        sign: '+',
        word: 'stabilizerPart',
        symbol: '[H{_2}Cy{^−}] + 2[HCy{^2−}] + [HClCy{^−}] + 2[ClCy{^2−}] + [Cl{_2}Cy{^−}]',
      },
      { sign: '+', word: 'boratePart', symbol: '[B(OH){_4}{^−}]' },
    ],
    further: ['pH = −log *γ* [H{^+}]'],
  },
  alkalinity: {
    terms: [
      { word: 'carbonate', symbol: '*A*{_C}' },
      { sign: '=', word: 'alkalinity', symbol: '*A*' },
      { sign: '−', word: 'stabilizerPart', symbol: '*A*{_Cy}' },
      { sign: '−', word: 'boratePart', symbol: '*A*{_B}' },
      { sign: '−', word: 'chlorinePart', symbol: '[OCl{^−}]' },
      { sign: '−', word: 'waterPart', symbol: '[OH{^−}] − [H{^+}]' },
    ],
  },
  calcium: {
    terms: [
      { word: 'index', symbol: 'SI' },
      { sign: '=', word: 'inWater', symbol: 'log *γ*{^2} [Ca{^2+}] [CO{_3}{^2−}]' },
      { sign: '−', word: 'canHold', symbol: 'log *K*(*T*)' },
    ],
  },
  'likely-range': {
    terms: [
      { word: 'oneOfMany', symbol: '*x*{_i}' },
      { sign: '=', word: 'middle', symbol: '*x*' },
      { sign: '×', word: 'nudge', symbol: 'e{^*σz*}' },
    ],
    further: [`*i* = 1, 2, … ${n.pools}`],
  },
  learning: {
    terms: [
      { word: 'after', symbol: '*x*′' },
      { sign: '=', word: 'before', symbol: '*x*' },
      { sign: '+', word: 'weight', symbol: '*K*' },
      { sign: '×', word: 'surprise', symbol: '(*y* − *ŷ*)' },
    ],
  },
  'liquid-strength': {
    terms: [
      { word: 'strengthNow', symbol: '*s*' },
      { sign: '=', word: 'strengthThen', symbol: '*s*{_0}' },
      { sign: '/', word: 'ageing', symbol: '(1 + *t* / *t*{_½})' },
    ],
    further: ['*t*{_½} = 1 / (*k* *c*{_0})'],
  },
  volume: {
    terms: [
      { word: 'volume', symbol: '*V*' },
      { sign: '=', word: 'surface', symbol: '*A*' },
      { sign: '×', word: 'depth', symbol: '*d*' },
    ],
    further: [
      '{=rectangle} *L* *W*',
      '{=oval} π/4 *L* *W*',
      '{=round} π/4 *D*{^2}',
      '{=kidney} 0.45 (*A* + *B*) *L*',
      '{=slopingBottom} ({=shallow} + {=deep}) / 2',
    ],
  },
  evaporation: {
    terms: [
      { word: 'evaporates', symbol: '*E*' },
      { sign: '=', word: 'wind', symbol: `${n.quietPool} (${n.stillAir} +\u00a0${n.perWind}\u00a0*v*)` },
      { sign: '×', word: 'drive', symbol: '(*p*{_w} − *p*{_a})' },
      { sign: '/', word: 'heat', symbol: '*Y*' },
    ],
  },
};

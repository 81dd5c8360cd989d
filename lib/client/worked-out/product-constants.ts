import {
  CHLORINE_PER_NITROGEN_AT_BREAKPOINT,
  CHLORINE_PER_NITROGEN_IN_MONOCHLORAMINE,
  FIELD_RULE_TIMES_COMBINED,
} from '@/lib/chemistry/breakpoint';
import { EXCESS_LYE, GAS_CONSTANT, hypochloriteDecayRate } from '@/lib/chemistry/hypochlorite-decay';
import {
  CYANURATE_OF_DICHLOR,
  hydrochloricAcidDensity,
  LIQUID_HYPOCHLORITE_DENSITY,
  SUBSTANCES,
  THIOSULFATE_ANHYDROUS_SHARE,
  THIOSULFATE_PER_CHLORINE,
} from '@/lib/chemistry/substances';
import { AVAILABLE_PER_HYPOCHLORITE, DENSITY_RISE } from '@/lib/storage/label-strength';
import { genericProducts } from '@/lib/standards/generic-products';
import { group } from './constant';

const substances = Object.keys(SUBSTANCES) as (keyof typeof SUBSTANCES)[];
const generic = Object.keys(genericProducts) as (keyof typeof genericProducts)[];

export const productConstants = [
  group(
    'pureStrength',
    ['free-chlorine'],
    'stoichiometry',
    substances.map((name) => ({
      name,
      value: SUBSTANCES[name].pureStrength,
      unit: 'percent',
      of: `chemistry/substances#SUBSTANCES.${name}.pureStrength`,
    })),
  ),
  group(
    'usualStrength',
    ['free-chlorine', 'tablets'],
    'labels',
    generic.map((name) => ({
      name,
      value: genericProducts[name].strength,
      unit: 'percent',
      of: `standards/generic-products#genericProducts.${name}.strength`,
    })),
  ),
  group('densities', ['ph', 'liquid-strength'], 'acidDensity', [
    {
      name: 'acidDensity',
      value: hydrochloricAcidDensity(SUBSTANCES['hydrochloric-acid'].defaultStrength),
      unit: 'gPerMillilitre',
      of: 'chemistry/substances#hydrochloricAcidDensity',
      at: [SUBSTANCES['hydrochloric-acid'].defaultStrength],
      formula: '*ρ* = 1 + 0.00509 · {=strength}',
    },
    {
      name: 'liquidDensity',
      value: LIQUID_HYPOCHLORITE_DENSITY,
      unit: 'gPerMillilitre',
      of: 'chemistry/substances#LIQUID_HYPOCHLORITE_DENSITY',
      source: 'practice',
    },
    {
      name: 'thiosulfate',
      value: THIOSULFATE_PER_CHLORINE,
      unit: 'none',
      of: 'chemistry/substances#THIOSULFATE_PER_CHLORINE',
      source: 'awwa',
    },
    {
      name: 'thiosulfateAnhydrous',
      value: THIOSULFATE_ANHYDROUS_SHARE,
      unit: 'none',
      of: 'chemistry/substances#THIOSULFATE_ANHYDROUS_SHARE',
      source: 'weights',
    },
    {
      name: 'dichlorAnhydrous',
      value: CYANURATE_OF_DICHLOR,
      unit: 'gPerMole',
      of: 'chemistry/substances#CYANURATE_OF_DICHLOR',
      source: 'epa2017',
    },
  ]),
  group('breakpoint', ['combined-chlorine'], 'stoichiometry', [
    {
      name: 'perNitrogen',
      value: CHLORINE_PER_NITROGEN_AT_BREAKPOINT,
      unit: 'none',
      of: 'chemistry/breakpoint#CHLORINE_PER_NITROGEN_AT_BREAKPOINT',
    },
    {
      name: 'perNitrogenInMonochloramine',
      value: CHLORINE_PER_NITROGEN_IN_MONOCHLORAMINE,
      unit: 'none',
      of: 'chemistry/breakpoint#CHLORINE_PER_NITROGEN_IN_MONOCHLORAMINE',
    },
    {
      name: 'fieldRule',
      value: FIELD_RULE_TIMES_COMBINED,
      unit: 'none',
      of: 'chemistry/breakpoint#FIELD_RULE_TIMES_COMBINED',
      source: 'kfla2011',
    },
  ]),
  group('decay', ['liquid-strength'], 'adam1999', [
    {
      name: 'decayRate',
      value: Math.log10(hypochloriteDecayRate(25, 4)),
      unit: 'none',
      of: 'chemistry/hypochlorite-decay#hypochloriteDecayRate',
      at: [25, 4],
      formula: 'k = 10{^0.149 *I*} · 2.083 · 10{^10} *T* e{^−101800/(*R* *T*)} e{^−56.5/*R*}',
    },
    {
      name: 'gasConstant',
      value: GAS_CONSTANT,
      unit: 'joulesPerMoleKelvin',
      of: 'chemistry/hypochlorite-decay#GAS_CONSTANT',
      source: 'gas',
    },
    {
      name: 'excessLye',
      value: EXCESS_LYE,
      unit: 'molesPerLitre',
      of: 'chemistry/hypochlorite-decay#EXCESS_LYE',
      source: 'lye',
    },
  ]),
  group('labelStrength', ['liquid-strength'], 'tradePercent', [
    {
      name: 'availablePerHypochlorite',
      value: AVAILABLE_PER_HYPOCHLORITE,
      unit: 'none',
      of: 'storage/label-strength#AVAILABLE_PER_HYPOCHLORITE',
      source: 'weights',
    },
    { name: 'densityRise', value: DENSITY_RISE, unit: 'gPerMillilitre', of: 'storage/label-strength#DENSITY_RISE' },
  ]),
];

import type { Language } from '@/lib/schemas/languages';
import { type Catalogue, english } from './english';
import { spanish } from './spanish';

export type Namespace = keyof Catalogue;

export const catalogues: Record<Language, Catalogue> = { en: english, es: spanish };

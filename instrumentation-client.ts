import { config } from 'zod/v4/core';
import { keepEmergencyCard } from '@/lib/client/kept-card';

// zod compiles its schemas with `new Function` unless told not to; the content security policy refuses that and reports it.
// This file runs before any page's own code, so before the first schema is made.
config({ jitless: true });

window.addEventListener('load', keepEmergencyCard);

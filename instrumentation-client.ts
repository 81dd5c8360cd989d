import { keepEmergencyCard } from '@/lib/client/kept-card';

// zod compiles its schemas with `new Function` unless told not to; the content security policy refuses that and reports it.
// zod itself comes after the page is drawn and reads its settings from here: importing it to say so would bring it at once.
Object.assign(globalThis, { __zod_globalConfig: { jitless: true } });

window.addEventListener('load', keepEmergencyCard);

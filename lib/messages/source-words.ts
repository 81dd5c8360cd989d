import { type Language, languageOf } from '@/lib/schemas/languages';

/** What a source says of a value, in Spanish, by the English beside the value. Titles and names of codes stay as they are printed. */
const spanishSources: Readonly<Record<string, string>> = {
  'NSW Health, Healthy swimming pools, 2022: not within two weeks of it':
    'NSW Health, Healthy swimming pools, 2022: no en las dos semanas siguientes',
  'US Army TB MED 575, 6-28: by hand a solution of 1 to 5 %; 300 g of granules in 15 L are 2 %':
    'US Army TB MED 575, 6-28: a mano, una solución del 1 al 5 %; 300 g de granulado en 15 L son un 2 %',
  'US CDC, fecal incident response: 2 mg/L for 30 minutes at pH 7.5 or less and 25 degrees C or more, without stabilizer':
    'US CDC, fecal incident response: 2 mg/L durante 30 minutos con pH 7,5 o menos y 25 grados C o más, sin estabilizante',
  'US EPA letter of 22 July 2010: re-entry prohibited above 4 mg/L; the label wins':
    'Carta de la US EPA del 22 de julio de 2010: prohibido volver al agua por encima de 4 mg/L; manda la etiqueta',
  'US EPA, WaterSense at Work (2012): 5 to 10 psi over the clean filter; the filter’s own paper comes first':
    'US EPA, WaterSense at Work (2012): de 5 a 10 psi por encima del filtro limpio; primero va el manual del propio filtro',
  'Western Australia Health and Health Canada: test daily while the pool is used':
    'Western Australia Health y Health Canada: analizar cada día mientras se usa la piscina',
  'a Stop that is asked at every dose is pressed blind by the third week':
    'un Alto que se pide en cada dosis se pulsa a ciegas a la tercera semana',
  'a dose is ticked at its time, not in the morning': 'una dosis se marca a su hora, no por la mañana',
  'a reading that looks like none': 'una medida que parece un cero',
  'a waterproof pencil mark, read against calm water with the pump off; small waves allow no more':
    'una marca de lápiz impermeable, leída con el agua en calma y la bomba apagada; con olas pequeñas no da para más',
  'about three tablets a week in a pool of 75 m3': 'unas tres pastillas por semana en una piscina de 75 m3',
  'first-aid texts of the poison centres of New Zealand, New South Wales, Queensland and Arizona; the label may ask for more':
    'textos de primeros auxilios de los centros de toxicología de Nueva Zelanda, Nueva Gales del Sur, Queensland y Arizona; la etiqueta puede pedir más',
  'from here the pump runs a whole turnover': 'desde aquí la bomba hace una renovación completa',
  'ideal columns of Montana ARM 37.115.1308, Table 6':
    'columnas de valores ideales de Montana ARM 37.115.1308, Table 6',
  'most of one turnover (6 to 8 h is published)': 'casi toda una renovación (se publican de 6 a 8 h)',
  'no public source found; the label comes first': 'no se encontró fuente pública; primero va la etiqueta',
  'no public text names a largest dose; ours, from the arithmetic of the water model. The label comes first.':
    'ningún texto público nombra una dosis máxima; la nuestra sale de la aritmética del modelo del agua. Primero va la etiqueta.',
  'once a month, by tube or shop slip': 'una vez al mes, con tubo o con el análisis de la tienda',
  'one day of chlorine loss at the lowest level in midsummer, from the projection':
    'la pérdida de cloro de un día en el nivel mínimo en pleno verano, según la proyección',
  'one swimmer-hour for 4 m3 in a day': 'una hora de bañista por cada 4 m3 en un día',
  'one turnover; for doses over 5 mg/L': 'una renovación; para dosis de más de 5 mg/L',
  'rain that dilutes and soils the water noticeably': 'lluvia que diluye y ensucia el agua de forma apreciable',
  'the lowest step most kits can read; below it the code minimum of plain chlorine holds':
    'el escalón más bajo que leen casi todos los kits; por debajo vale el mínimo de la norma para cloro sin estabilizar',
  'time in which a strong dose can bleach the colour': 'tiempo en que una dosis fuerte puede decolorar el reactivo',
  'two days; health authorities advise a check on every day of swimming':
    'dos días; las autoridades sanitarias aconsejan un control cada día de baño',
  'two weekly tests missed': 'dos análisis semanales sin hacer',
  "hardness 150 to 1000 allowed, 200 to 400 ideal (Montana ARM 37.115.1308); the split by surface is practice. The surface maker's paper comes first.":
    'dureza de 150 a 1000 permitida, de 200 a 400 ideal (Montana ARM 37.115.1308); el reparto por revestimiento es práctica. Primero va la hoja del fabricante del revestimiento.',
  'what gathered under the cover leaves; no public source found':
    'se va lo que se juntó bajo la cubierta; no se encontró fuente pública',
  'the dose spreads and airs; no public source found': 'la dosis se reparte y se airea; no se encontró fuente pública',
  'as long as one plan reaches': 'tanto como alcanza un plan',
  'day and night, so that all of the water passes the filter': 'día y noche, para que toda el agua pase por el filtro',
  'long enough for a slip of the finger': 'lo bastante para un desliz del dedo',
  'as long as the pump is kept running to spread it': 'mientras la bomba sigue en marcha para repartirla',
  'it heats the water: so much and no more in one bucket': 'calienta el agua: tanto y no más en un cubo',
  'two steps of a drop kit of 10 mg/L, and what a week takes':
    'dos escalones de un kit de gotas de 10 mg/L, y lo que gasta una semana',
  "the surface maker's paper comes first": 'primero va la hoja del fabricante del revestimiento',
  'half way, then test again': 'la mitad, y después otro análisis',
  'calcium carbonate comes out of solution': 'el carbonato cálcico sale de la solución',
  'the builder knows the ground water': 'el constructor conoce el agua subterránea',
  'raised to what codes allow at most, and read the morning after':
    'se sube a lo máximo que permiten las normas, y se lee a la mañana siguiente',
  'in steps, with a test after each; sun and an open cover do the rest':
    'por pasos, con un análisis después de cada uno; el sol y la cubierta abierta hacen el resto',
  'a day': 'un día',
};

const sources: Readonly<Record<Exclude<Language, 'en'>, Readonly<Record<string, string>>>> = { es: spanishSources };

/** What a source says, in the language of a locale. */
export function sourceIn(locale: string, text: string): string {
  const language = languageOf(locale);
  return language === 'en' ? text : (sources[language][text] ?? text);
}

/** Every text that is translated, for the test that holds this table complete. */
export const translatedSources: readonly string[] = Object.keys(spanishSources);

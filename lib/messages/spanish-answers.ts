/**
 * What the server says when it refuses something, in Spanish. The English sentence is the key, its gaps numbered in their order;
 * words that fill a gap stand here as well.
 */
export const spanishAnswers: Readonly<Record<string, string>> = {
  'former member': 'quien ya no está',
  'You are not signed in on this device, or no longer.': 'Tu sesión no está abierta en este dispositivo, o ya no.',
  'You are the last owner of {0}, and others belong to it. Make somebody an owner first, or close it.':
    'Eres la última persona propietaria de {0}, y otras pertenecen a él. Haz antes propietario a alguien, o ciérralo.',
  'By now nobody else belongs to {0}: it would be deleted with everything in it. Look again first.':
    'Ya nadie más pertenece a {0}: se borraría con todo lo que contiene. Mira antes otra vez.',
  'A look round has no account to delete. Sign out, and it is gone after a day.':
    'Una visita de muestra no tiene cuenta que borrar. Cierra la sesión, y en un día ya no está.',
  'A look round has no account. Sign out, then start a sheet of your own.':
    'Una visita de muestra no tiene cuenta. Cierra la sesión y empieza tu propia hoja.',
  'The demo household is not closed: it is gone after a day.':
    'El hogar de muestra no se cierra: en un día ya no está.',
  'The household is called {0}. Write its name to close it.': 'El hogar se llama {0}. Escribe su nombre para cerrarlo.',
  'Only an owner can close this household.': 'Solo un propietario puede cerrar este hogar.',
  'Write the name of the household.': 'Escribe el nombre del hogar.',
  'Write your name.': 'Escribe tu nombre.',
  'Keep the name under 80 characters.': 'Escribe el nombre con menos de 80 caracteres.',
  'Write what you call the pool or the house.': 'Escribe cómo llamas a la piscina o a la casa.',
  'Choose a time zone such as America/New_York.': 'Elige una zona horaria, por ejemplo America/New_York.',
  'Choose a language such as en-US.': 'Elige un idioma, por ejemplo en-US.',
  'Choose metric or US units.': 'Elige unidades métricas o de EE. UU.',
  'Write your e-mail address.': 'Escribe tu correo.',
  'Write an e-mail address like ines@pool.example.': 'Escribe un correo como ines@pool.example.',
  'Choose a password.': 'Elige una contraseña.',
  'Use at least {0} characters. A few words in a row are easy to keep in mind.':
    'Usa al menos {0} caracteres. Unas cuantas palabras seguidas se recuerdan con facilidad.',
  'Use at most {0} characters.': 'Usa como máximo {0} caracteres.',
  'Write your password.': 'Escribe tu contraseña.',
  'A password has at most {0} characters.': 'Una contraseña tiene como máximo {0} caracteres.',
  'This reading is taken after now, {0}.': 'Esta medida es posterior a ahora, {0}.',
  'Another reading has a value of this for the same instant.':
    'Otra medida tiene un valor de esto para el mismo instante.',
  'Write something, or leave it empty.': 'Escribe algo, o déjalo vacío.',
  'Keep it to {0} characters: the sheet is one page.': 'No pases de {0} caracteres: la hoja es una página.',
  'Keep it to {0} characters: one number.': 'No pases de {0} caracteres: un solo número.',
  'A phone number has digits, spaces and + ( ) / . - only. Names go into the field for names.':
    'Un número de teléfono lleva cifras, espacios y + ( ) / . - y nada más. Los nombres van en el campo de los nombres.',
  'Write the whole number.': 'Escribe el número completo.',
  'Write a name, or none.': 'Escribe un nombre, o ninguno.',
  'This one is a liquid.': 'Este es un líquido.',
  'This one is not sold as a liquid.': 'Este no se vende como líquido.',
  'Copy the strength from the label.': 'Copia la concentración de la etiqueta.',
  'Write what one tablet weighs.': 'Escribe cuánto pesa una pastilla.',
  'Say when it was bought: liquid chlorine loses strength on the shelf.':
    'Di cuándo se compró: el cloro líquido pierde concentración en el estante.',
  'Write how much is left.': 'Escribe cuánto queda.',
  'Write 0 or more.': 'Escribe 0 o más.',
  'That is more than a shelf holds.': 'Eso es más de lo que cabe en un estante.',
  'Only an adult handles chemicals.': 'Solo una persona adulta maneja los productos químicos.',
  'Read the safety card to its end first.': 'Primero lee la tarjeta de seguridad hasta el final.',
  'Choose English or Spanish.': 'Elige inglés o español.',
  'This is not written as expected.': 'Esto no está escrito como se esperaba.',
  'Write a number.': 'Escribe un número.',
  'Write a whole number.': 'Escribe un número entero.',
  'Write some text.': 'Escribe un texto.',
  'Answer yes or no.': 'Responde sí o no.',
  'Send a list here.': 'Envía aquí una lista.',
  'Fill in this part.': 'Rellena esta parte.',
  'This is needed.': 'Esto hace falta.',
  'Choose one of these: {0}.': 'Elige uno de estos valores: {0}.',
  'Wadewell does not know this field: {0}.': 'Wadewell no conoce este campo: {0}.',
  'This id is not one that a device of ours made.': 'Este identificador no lo creó ningún dispositivo nuestro.',
  'Use at least {0} characters.': 'Usa al menos {0} caracteres.',
  'Name at least {0}.': 'Indica al menos {0}.',
  'Write a number over {0}.': 'Escribe un número mayor que {0}.',
  'Write {0} or more.': 'Escribe {0} o más.',
  'Name at most {0}.': 'Indica como máximo {0}.',
  'Write a number under {0}.': 'Escribe un número menor que {0}.',
  'Write {0} or less.': 'Escribe {0} o menos.',
  'Count whole tablets.': 'Cuenta pastillas enteras.',
  'No feeder holds that many. Count again.': 'En ningún dosificador caben tantas. Cuenta otra vez.',
  'Write how much went in.': 'Escribe cuánto se añadió.',
  'Choose what keeps the pool clean.': 'Elige qué mantiene limpia la piscina.',
  'Choose what it is: a pool, a pool with a spa, or a hot tub.':
    'Elige qué es: una piscina, una piscina con spa o una bañera de hidromasaje.',
  'Choose what the pool is lined with, or "not sure".': 'Elige de qué está revestida la piscina, o “No lo sé seguro”.',
  'Write the {0} in degrees, or choose a town.': 'Escribe {0} en grados, o elige una localidad.',
  'A {0} lies between -{1} and {2} degrees.': 'Un valor de {0} está entre -{1} y {2} grados.',
  'Keep the name of the town under 80 characters.': 'Escribe el nombre de la localidad con menos de 80 caracteres.',
  'Say how much sun the pool gets.': 'Di cuánto sol recibe la piscina.',
  'Say which cover the pool has, or none.': 'Di qué cubierta tiene la piscina, o ninguna.',
  'Say where slow tablets go: a feeder, a floater, or nothing yet.':
    'Di dónde van las pastillas lentas: un dosificador, un dosificador flotante, o nada todavía.',
  'Copy the active ingredient from the label of the feeder.':
    'Copia el ingrediente activo de la etiqueta del dosificador.',
  'Write how many tablets it holds.': 'Escribe cuántas pastillas caben.',
  'A feeder holds 60 tablets at most.': 'En un dosificador caben 60 pastillas como máximo.',
  'Copy the active ingredient from the label of the feeder: only the same one may go in.':
    'Copia el ingrediente activo de la etiqueta del dosificador: solo puede entrar ese mismo.',
  'Twelve running times a day are enough.': 'Bastan doce horarios al día.',
  'Choose how you test: strips, a drop kit or a shop slip.':
    'Elige cómo analizas: tiras, un kit de gotas o un informe de la tienda.',
  'Choose what the label says: 4, 5, 10 mg/L, or that it does not say.':
    'Elige lo que dice la etiqueta: 4, 5, 10 mg/L, o que no lo dice.',
  'Swimming ends after it begins, on the same day.': 'El baño termina después de empezar, el mismo día.',
  'Say which part of the profile this is.': 'Di qué parte del perfil es esta.',
  'That would be an unusual pool. Did you mean cubic metres?':
    'Sería una piscina poco común. ¿Querías decir metros cúbicos?',
  'That would be an unusual pool. Did you mean litres?': 'Sería una piscina poco común. ¿Querías decir litros?',
  'That would be an unusual pool. Did you mean US gallons?':
    'Sería una piscina poco común. ¿Querías decir galones de EE. UU.?',
  'Write the {0}.': 'Escribe {0}.',
  'The {0} is {1} m at least.': 'El mínimo para {0} es de {1} m.',
  'The {0} is {1} m at most.': 'El máximo para {0} es de {1} m.',
  'Write the volume.': 'Escribe el volumen.',
  'No garden pool is that big.': 'Ninguna piscina de jardín es tan grande.',
  'Choose the unit of the volume.': 'Elige la unidad del volumen.',
  'Say whether the figure is known or guessed.': 'Di si la cifra se sabe o es a ojo.',
  'Choose the shape.': 'Elige la forma.',
  'The deep end is at least as deep as the shallow end.':
    'La parte honda es al menos tan honda como la parte poco honda.',
  'Choose how the floor runs.': 'Elige cómo es el fondo.',
  'No garden pool is that big. Check the measures.': 'Ninguna piscina de jardín es tan grande. Revisa las dimensiones.',
  'Say whether you know the volume or measure the pool.': 'Di si sabes el volumen o mides la piscina.',
  'A garden pool holds {0} to {1} cubic metres. Check the figure and its unit.':
    'En una piscina de jardín caben de {0} a {1} metros cúbicos. Revisa la cifra y su unidad.',
  'A pool of 1 to 1000 m3 can be planned.': 'Se puede planificar una piscina de 1 a 1000 m3.',
  'The lower end comes first.': 'Primero va el extremo más bajo.',
  'The lower value comes first.': 'Primero va el valor más bajo.',
  'A value from {0} to {1} is possible here.': 'Aquí es posible un valor de {0} a {1}.',
  'Keep the note under 500 characters.': 'Escribe la nota con menos de 500 caracteres.',
  'Enter at least one value. Untouched means not measured.': 'Anota al menos un valor. Sin tocar significa sin medir.',
  'A full test needs free chlorine and pH: without them there is no plan.':
    'Un análisis completo necesita cloro libre y pH: sin ellos no hay plan.',
  'A gauge shows {0} to {1} bar.': 'Un manómetro marca de {0} a {1} bar.',
  'Each thing is said once.': 'Cada cosa se dice una vez.',
  'Two products have the id "{0}".': 'Dos productos tienen el identificador “{0}”.',
  'You come back after you leave. Check the days.': 'La vuelta es después de la salida. Revisa los días.',
  'Longer than seven days needs a named adult with a weekly test, or a closed pool.':
    'Más de siete días exigen una persona adulta designada, con un análisis por semana, o una piscina cerrada.',
  'Write who looks after the pool.': 'Escribe quién cuida la piscina.',
  'Write a date and time with its offset, like 2026-07-05T19:00:00-04:00.':
    'Escribe una fecha y hora con su desfase horario, como 2026-07-05T19:00:00-04:00.',
  'Write a day like 2026-07-05.': 'Escribe un día como 2026-07-05.',
  'Write a time of day like 19:40.': 'Escribe una hora del día como 19:40.',
  'Say each day once.': 'Di cada día una vez.',
  'Keep the note to {0} characters.': 'No pases de {0} caracteres en la nota.',
  'The situation that is open is another one. Load the page again.':
    'La situación abierta es otra. Vuelve a cargar la página.',
  'There is no such dose in this household.': 'En este hogar no existe esa dosis.',
  'This was confirmed by somebody else. Read the Stop and confirm it yourself.':
    'Esto lo confirmó otra persona. Lee el Alto y confírmalo tú.',
  'This product is not on the shelf, or no longer.': 'Este producto no está en el estante, o ya no está.',
  '{0} has added it already.': '{0} ya la ha añadido.',
  'This dose was skipped. Undo that first.': 'Esta dosis se omitió. Primero deshaz eso.',
  '{0} has it. Ask before you add anything.': '{0} se encarga. Pregunta antes de añadir nada.',
  'This dose was ticked as added. Undo that first.': 'Esta dosis se marcó como añadida. Primero deshaz eso.',
  'There is nothing to undo: nobody ticked this dose.': 'No hay nada que deshacer: nadie marcó esta dosis.',
  'Two people ticked this dose. Each can undo their own tick; if not, test the water.':
    'Dos personas marcaron esta dosis. Cada una puede deshacer su propia marca; si no, analiza el agua.',
  'Only {0} or an owner can undo this.': 'Solo {0} o un propietario puede deshacer esto.',
  'A tick can be taken back for 10 minutes; after that an owner can.':
    'Una marca se puede deshacer durante 10 minutos; después puede un propietario.',
  'This correction belongs to another test.': 'Esta corrección es de otro análisis.',
  'Only an owner can correct the tests of others.':
    'Solo un propietario puede corregir los análisis de otras personas.',
  'You can correct a test of your own for 48 hours; after that an owner can.':
    'Puedes corregir un análisis tuyo durante 48 horas; después puede un propietario.',
  'There is no such test. It may have been deleted.': 'Ese análisis no existe. Puede que se haya borrado.',
  'There is no such event here.': 'Aquí no existe ese suceso.',
  'This is not over yet: a step or a test is missing.': 'Esto aún no ha terminado: falta un paso o un análisis.',
  'This household has no pool.': 'Este hogar no tiene piscina.',
  'Many people are looking round just now. Try again in an hour, or sign up.':
    'Ahora mismo hay mucha gente dando una vuelta. Vuelve a intentarlo en una hora, o empieza tu hoja.',
  'Describe the pool first; then a procedure can be worked out for it.':
    'Primero describe la piscina; después se puede calcular un procedimiento para ella.',
  'Another situation is open. Only one can be open at a time: end it first.':
    'Hay otra situación abierta. Solo puede haber una abierta a la vez: termínala primero.',
  'This was begun in another household.': 'Esto se empezó en otro hogar.',
  'The situation that is open keeps everyone out of the water. Finish it first.':
    'La situación abierta mantiene a todo el mundo fuera del agua. Termínala primero.',
  'There is no such try-out here.': 'Aquí no existe esa prueba.',
  'A test cannot be later than now.': 'Un análisis no puede ser posterior a ahora.',
  'What happened cannot be later than now.': 'Lo que pasó no puede ser posterior a ahora.',
  '{0} Check the day and the hour.': '{0} Revisa el día y la hora.',
  'This test was sent before and has been deleted since.':
    'Este análisis se envió antes y desde entonces se ha borrado.',
  'This round was written down in another household.': 'Esta ronda se anotó en otro hogar.',
  'A visit cannot be later than today.': 'Una visita no puede ser posterior a hoy.',
  '{0} Check the day.': '{0} Revisa el día.',
  'This visit was written down in another household.': 'Esta visita se anotó en otro hogar.',
  'This was written down in another household.': 'Esto se anotó en otro hogar.',
  'There is no such situation here.': 'Aquí no existe esa situación.',
  'This situation is over. Somebody ended it.': 'Esta situación ha terminado. Alguien le puso fin.',
  'Answer the parts before this one first.': 'Responde primero a las partes anteriores a esta.',
  'A shelf holds {0} products. Take away what is used up.':
    'En un estante caben {0} productos. Quita lo que se haya acabado.',
  'Describe the pool first; then there is a week to show.':
    'Primero describe la piscina; después habrá una semana que mostrar.',
  'This e-mail address and this password do not go together.': 'Este correo y esta contraseña no se corresponden.',
  'This password is one of those that are tried first. Choose another.':
    'Esta contraseña es una de las que se prueban primero. Elige otra.',
  'There is an account with this e-mail already. Sign in instead.':
    'Ya hay una cuenta con este correo. En lugar de eso, entra.',
  'This was taken into the plan of another household.': 'Esto se llevó al plan de otro hogar.',
  'Nothing was changed.': 'No se cambió nada.',
  'Only the days from today to the end of the plan can be tried.':
    'Solo se pueden probar los días desde hoy hasta el final del plan.',
  'No more than {0} slow tablets may go in this week.':
    'Pastillas lentas que se pueden añadir esta semana: no más de {0}.',
  'This dose cannot go in on that evening.': 'Esta dosis no se puede añadir esa noche.',
  'With this the plan would go past one of its limits, so nothing was changed. Try less, or another evening.':
    'Con esto el plan pasaría de uno de sus límites, así que no se cambió nada. Prueba con menos, o con otra noche.',
  'The plan has changed meanwhile. Look at the new one, then try it again.':
    'Mientras tanto el plan ha cambiado. Mira el nuevo y después pruébalo otra vez.',
  'This tick was recorded in another household.': 'Esta marca se anotó en otro hogar.',
  'This dose can be ticked from {0}, three hours before its hour.':
    'Esta dosis se puede marcar desde el {0}, tres horas antes de su hora.',
  'Only a dose of tablets tells what was left in the feeder.':
    'Solo una dosis de pastillas dice lo que quedaba en el dosificador.',
  'A dose cannot have gone in later than now.': 'Una dosis no puede haberse añadido después de ahora.',
  'That is more than a day before this dose was planned. Check the day and the hour.':
    'Eso es más de un día antes de lo previsto para esta dosis. Revisa el día y la hora.',
  'This step is not one to tick.': 'Este paso no es de los que se marcan.',
  'Load the page again: the steps have changed.': 'Vuelve a cargar la página: los pasos han cambiado.',
  'This can be ticked on its day: look at the drain in the morning.':
    'Esto se puede marcar en su día: mira el sumidero por la mañana.',
  'It can be ticked on its day.': 'Se puede marcar en su día.',
  'There is no plan yet to try anything on. Test the water first.':
    'Aún no hay ningún plan en el que probar algo. Analiza primero el agua.',
  'For this pool only a record is kept: there is no plan to change.':
    'De esta piscina solo se lleva un registro: no hay ningún plan que cambiar.',
  'An open situation leads this week. Its steps come first: end it before changing the plan.':
    'Una situación abierta dirige esta semana. Sus pasos van primero: termínala antes de cambiar el plan.',
  'This plan no longer fits what is known of the water. Test again, then try it.':
    'Este plan ya no encaja con lo que se sabe del agua. Analiza otra vez y después pruébalo.',
  'You do not belong to a household, or your time there is over. Ask its owner.':
    'No perteneces a ningún hogar, o tu tiempo en él ha terminado. Pregunta a su propietario.',
  'Only an owner of this household can change that.': 'Solo un propietario de este hogar puede cambiar eso.',
  'You can look at this household, but not change it.': 'Puedes ver este hogar, pero no cambiarlo.',
  'You cannot see this household.': 'No puedes ver este hogar.',
  'Only an owner can let the pool be learnt anew.':
    'Solo un propietario puede hacer que se vuelva a aprender la piscina.',
  'Only an owner can add or remove products. You can count what is left.':
    'Solo un propietario puede añadir o quitar productos. Tú puedes contar lo que queda.',
  'Only members who handle chemicals, and have read the safety card this season, can tick doses.':
    'Solo los miembros que manejan los productos químicos, y han leído la tarjeta de seguridad esta temporada, pueden marcar dosis.',
  'Too many tries in a short time. Wait a quarter of an hour, then try again.':
    'Demasiados intentos en poco tiempo. Espera un cuarto de hora y vuelve a intentarlo.',
  'Too many tries in a short time. Wait an hour, then try again.':
    'Demasiados intentos en poco tiempo. Espera una hora y vuelve a intentarlo.',
  'That was too often for one day. Try again tomorrow.':
    'Fueron demasiadas veces para un día. Vuelve a intentarlo mañana.',
  'You are signed out. Sign in, then try again.': 'Tu sesión está cerrada. Entra y vuelve a intentarlo.',
  'This address answers {0} only.': 'Esta dirección solo responde a {0}.',
  'Send JSON, with the content type application/json.': 'Envía JSON, con el tipo de contenido application/json.',
  'What was sent is no complete JSON. Send it again.': 'Lo que se envió no es un JSON completo. Envíalo otra vez.',
  'That is too much to send at once.': 'Es demasiado para enviarlo de una vez.',
  'Some fields need another look.': 'Algunos campos necesitan otra mirada.',
  'Something went wrong on our side.': 'Algo falló por nuestra parte.',
  'This was sent from another site, so nothing was changed.':
    'Esto se envió desde otro sitio, así que no se cambió nada.',
  'There is nothing at this address.': 'En esta dirección no hay nada.',
  '{0} is {1}; the water model permits {2} to {3}.':
    'El valor para {0} es {1}; el modelo del agua admite de {2} a {3}.',
  'No amount of {0} brings {1} to {2}.': 'Ninguna cantidad de {0} lleva {1} a {2}.',
  'Day number {0} is out of range.': 'El número de día {0} está fuera de rango.',
  '{0} is not an instant.': '{0} no es un instante.',
  '{0} is not a {1}.': '{0} no es un valor posible para {1}.',
  '{0} cannot be written as a number.': '{0} no se puede escribir como número.',
  '{0} is not measured in {1}.': 'No se mide {0} en {1}.',
  '{0} is not a volume.': '{0} no es un volumen.',
  '{0} is no {1} and cannot become {2}.': '{0} no es una unidad para {1} y no se puede convertir en {2}.',
  'These measures do not make a pool.': 'Con estas dimensiones no sale una piscina.',
  'Enter a length above zero.': 'Escribe una longitud mayor que cero.',
  'Name a product of the shelf, or a substance.': 'Nombra un producto del estante, o una sustancia.',
  'No product "{0}" is on the shelf.': 'En el estante no hay ningún producto “{0}”.',
  'A blend cannot be reckoned with: its contents are not known.':
    'Con un producto mixto no se puede calcular: no se sabe qué contiene.',
  'This product is counted in {0}.': 'Este producto se cuenta en {0}.',
  'These tablets bring no chlorine: they cannot be reckoned with.':
    'Estas pastillas no aportan cloro: no se puede calcular con ellas.',
  'The plan was refused: {0}.': 'El plan se rechazó: {0}.',
  'Only chlorine can be wished for another evening.': 'Solo se puede pedir cloro para otra noche.',
  'The plan could not be worked out in time. Your entries are saved; try again in a moment.':
    'El plan no se pudo calcular a tiempo. Lo que anotaste está guardado; vuelve a intentarlo en un momento.',
  Somebody: 'Alguien',
  'whoever ticked it': 'quien la marcó',
  latitude: 'la latitud',
  longitude: 'la longitud',
  depth: 'la profundidad',
  'depth of the water': 'la profundidad del agua',
  length: 'el largo',
  width: 'el ancho',
  diameter: 'el diámetro',
  tablet: 'pastillas',
  freeChlorine: 'el cloro libre',
  combinedChlorine: 'el cloro combinado',
  pH: 'el pH',
  totalAlkalinity: 'la alcalinidad total',
  'reading.totalAlkalinity': 'la alcalinidad total de la medida',
  calciumHardness: 'la dureza cálcica',
  cyanuricAcid: 'el ácido cianúrico',
  dissolvedSolids: 'los sólidos disueltos',
  temperature: 'la temperatura',
  borate: 'el borato',
  cyanurate: 'el cianurato',
  alkalinity: 'la alcalinidad',
  inorganicCarbon: 'el carbono inorgánico',
  calcium: 'el calcio',
  volume: 'el volumen',
  strength: 'la concentración',
  alkali: 'el álcali',
  amount: 'la cantidad',
  days: 'los días',
  waterTemperature: 'la temperatura del agua',
  airTemperature: 'la temperatura del aire',
  relativeHumidity: 'la humedad relativa',
  windSpeed: 'la velocidad del viento',
  level: 'el nivel',
  rain: 'la lluvia',
  area: 'la superficie',
  mass: 'la masa',
  liquidVolume: 'el volumen de líquido',
  pressure: 'la presión',
  pricePerMass: 'el precio por masa',
  pricePerLiquidVolume: 'el precio por volumen de líquido',
  concentration: 'la concentración en el agua',
  acidity: 'la acidez',
  trichlor: 'tricloro',
  dichlor: 'dicloro',
  'calcium-hypochlorite': 'hipoclorito cálcico',
  'sodium-hypochlorite': 'hipoclorito sódico',
  'hydrochloric-acid': 'ácido clorhídrico',
  'sodium-bisulfate': 'bisulfato sódico',
  'sodium-bicarbonate': 'bicarbonato sódico',
  'sodium-carbonate': 'carbonato sódico',
  'calcium-chloride': 'cloruro cálcico',
  'cyanuric-acid': 'ácido cianúrico',
  'sodium-thiosulfate': 'tiosulfato sódico',
  'a volume outside 1 to 1000 m3': 'un volumen fuera de 1 a 1000 m3',
  'a figure is not finite': 'una cifra no es finita',
  'more {0} than the shelf holds': 'más {0} de lo que hay en el estante',
  'doses without a projection': 'dosis sin una proyección',
  'free chlorine may pass 10 mg/L': 'el cloro libre puede pasar de 10 mg/L',
  'two doses beside chlorine without a test between': 'dos dosis además del cloro sin un análisis entre ellas',
  'calcium within a day of a carbonate': 'calcio a menos de un día de un carbonato',
  'acid lowers pH by more than 0.4': 'el ácido baja el pH más de 0,4',
  'acid takes pH under 7.2': 'el ácido lleva el pH por debajo de 7,2',
  'acid may take pH under 7.2': 'el ácido puede llevar el pH por debajo de 7,2',
  'soda in hard water or over pH 7.5': 'carbonato sódico en agua dura o con un pH de más de 7,5',
  'no instant: {0}': 'no es un instante: {0}',
  '{0} before now': '{0} antes de ahora',
  '{0} in swim hours': '{0} en horas de baño',
  '{0} is not on the shelf': '{0} no está en el estante',
  'no amount of {0}': 'ninguna cantidad de {0}',
  '{0} against its label': '{0} en contra de su etiqueta',
  'dichlor though stabilizer is at 50 or more': 'dicloro aunque el estabilizante está en 50 o más',
  'more {0} than one evening may add': 'más {0} de lo que se puede añadir en una noche',
  'more chlorine on {0} than one evening may add': 'más cloro el {0} de lo que se puede añadir en una noche',
  'chlorine within 4 h of acid': 'cloro a menos de 4 h del ácido',
  'two products in one visit': 'dos productos en una misma visita',
  'tablets without a feeder for them': 'pastillas sin un dosificador para ellas',
  'tablets of another ingredient': 'pastillas de otro ingrediente',
  'tablets though stabilizer was never measured': 'pastillas aunque el estabilizante nunca se midió',
  'tablets at a pH under 7.0': 'pastillas con un pH por debajo de 7,0',
  'tablets though stabilizer was read on strips alone': 'pastillas aunque el estabilizante solo se leyó con tiras',
  'tablets though stabilizer is above its band': 'pastillas aunque el estabilizante está por encima de su franja',
  'a broken tablet': 'una pastilla partida',
  '{0} tablets in a feeder for {1}': '{0} pastillas en un dosificador para {1}',
  'too many tablets for the water': 'demasiadas pastillas para el agua',
  'tablets raise stabilizer too much': 'las pastillas suben demasiado el estabilizante',
  '{0} (tablets alone)': '{0} (solo pastillas)',
  '{0} (granular alone)': '{0} (solo granulado)',
  '{0} (liquid alone)': '{0} (solo líquido)',
  'Keep the words to {0} characters.': 'No pases de {0} caracteres.',
  'A piece of equipment stands for itself.': 'Un equipo no pertenece a otra cosa.',
  'Say what this photo belongs to.': 'Indica a qué pertenece esta foto.',
  'What this photo belongs to is no longer there.': 'Aquello a lo que pertenece esta foto ya no está.',
  'This photo was added in another household.': 'Esta foto se añadió en otro hogar.',
  'There is no room for more photos. Take one away first.': 'No caben más fotos. Quita antes una.',
  'This photo is not there, or no longer.': 'Esta foto no está, o ya no está.',
  'Only an owner can take away the photos of others.': 'Solo un propietario puede quitar las fotos de otros.',
  'Send a picture, with its content type.': 'Envía una imagen, con su tipo de contenido.',
  'A picture may have {0} MB. Send a smaller one.': 'Una imagen puede tener {0} MB. Envía una más pequeña.',
  'This picture has too many pixels. Send a smaller one: 12 megapixels are plenty.':
    'Esta imagen tiene demasiados píxeles. Envía una más pequeña: 12 megapíxeles son de sobra.',
  'This picture is not whole, or cannot be read. Take it again, or send another.':
    'Esta imagen no está completa o no se puede leer. Hazla de nuevo, o envía otra.',
  'This is no photo. Choose a picture in JPEG, PNG or WebP.':
    'Esto no es una foto. Elige una imagen en JPEG, PNG o WebP.',
  'This photo is in a format that cannot be read here (HEIC or AVIF). Send it as JPEG: the settings of a camera name it the compatible format.':
    'Esta foto está en un formato que aquí no se puede leer (HEIC o AVIF). Envíala como JPEG: en los ajustes de la cámara es el formato compatible.',
  'Write their name.': 'Escribe su nombre.',
  'Somebody who only looks does not handle chemicals.': 'Quien solo mira no maneja productos químicos.',
  'This link is not whole. Copy all of it.': 'Este enlace no está completo. Cópialo entero.',
  'Only an owner can invite, change or remove members.':
    'Solo un propietario puede invitar, cambiar o quitar personas.',
  'So many invitations are open already. Withdraw one first.': 'Ya hay muchas invitaciones abiertas. Retira antes una.',
  'This invitation was sent already. Send it again to get another link.':
    'Esta invitación ya se envió. Pide un enlace nuevo para tener otro.',
  'Nobody can be invited into the demo household.': 'No se puede invitar a nadie al hogar de muestra.',
  'This invitation is used, withdrawn, or not of this household.':
    'Esta invitación ya se usó, se retiró o no es de este hogar.',
  'This person does not belong to the household, or no longer.': 'Esta persona no pertenece al hogar, o ya no.',
  'A household needs an owner. Make somebody else an owner first.':
    'Un hogar necesita un propietario. Haz antes propietario a otra persona.',
  'This invitation is not known. Ask for another link.': 'Esta invitación no se conoce. Pide otro enlace.',
  'You belong to this household already.': 'Ya perteneces a este hogar.',
  'This invitation is used, withdrawn or over. Ask for another link.':
    'Esta invitación ya se usó, se retiró o venció. Pide otro enlace.',
  'An owner has to mark you as an adult who handles chemicals first.':
    'Antes, un propietario tiene que indicar que eres una persona adulta que maneja productos químicos.',
  'Write a name for the passkey.': 'Escribe un nombre para la llave de acceso.',
  'Wadewell is opened by a number here, and passkeys need a name. Sign in with your password.':
    'Aquí Wadewell se abre con un número, y las llaves de acceso necesitan un nombre. Entra con tu contraseña.',
  'Passkeys need an address that begins with https. Sign in with your password.':
    'Las llaves de acceso necesitan una dirección que empiece por https. Entra con tu contraseña.',
  'You have {0} passkeys, which is as many as can be kept. Forget one, then add this one.':
    'Tienes {0} llaves de acceso, que son todas las que se pueden guardar. Olvida una y luego añade esta.',
  'A look round has no account, so it has no passkeys.':
    'Una visita de muestra no tiene cuenta, así que no tiene llaves de acceso.',
  'This passkey could not be checked, or it took too long. Begin again.':
    'Esta llave de acceso no se pudo comprobar, o tardó demasiado. Empieza de nuevo.',
  'This passkey is known already. Make another one.': 'Esta llave de acceso ya está guardada. Crea otra.',
  'This passkey is not one of yours, or no longer.': 'Esta llave de acceso no es tuya, o ya no.',
  'This passkey does not open a sheet here. Sign in with your e-mail address and your password.':
    'Esta llave de acceso no abre ninguna hoja aquí. Entra con tu correo y tu contraseña.',
  'Write the password you have now.': 'Escribe la contraseña que tienes ahora.',
  'This is not the password you have now.': 'Esta no es la contraseña que tienes ahora.',
  'A look round has no account. Sign out, then open the link again.':
    'Una vuelta por la muestra no tiene cuenta. Cierra la sesión y abre de nuevo el enlace.',
  'The name has characters that cannot be seen. Write it again by hand.':
    'El nombre tiene caracteres que no se ven. Escríbelo otra vez a mano.',
  'This address has letters beyond a to z, which can look like others. Write it with plain letters, as your mail program shows it.':
    'Esta dirección tiene letras que no van de la a a la z y que pueden parecer otras. Escríbela con letras simples, como la muestra tu programa de correo.',
  'This link is used, over or not known. Ask for another mail.':
    'Este enlace ya se usó, venció o no se conoce. Pide otro correo.',
  'Another account has this address by now. Nothing was changed.':
    'Otra cuenta ya tiene esta dirección. No se ha cambiado nada.',
  'Another account has this address.': 'Otra cuenta tiene esta dirección.',
  'This server sends no mail. Ask whoever runs it for another password.':
    'Este servidor no envía correo. Pide otra contraseña a quien lo lleva.',
  'This server sends no mail. Make a link, and send it yourself.':
    'Este servidor no envía correo. Crea un enlace y envíalo tú.',
  'Confirm your own address first, or make a link and send it yourself.':
    'Confirma antes tu propia dirección, o crea un enlace y envíalo tú.',
  'So many mails have gone out today. Make a link, and send it yourself.':
    'Hoy ya han salido muchos correos. Crea un enlace y envíalo tú.',
  'Only an owner can hand the pool over or take it back.':
    'Solo un propietario puede dejar la piscina a otra persona o recuperarla.',
  'Only an owner can see who changed what.': 'Solo un propietario puede ver quién cambió qué.',
  'Choose who looks after it.': 'Elige quién la cuida.',
  'The last day away comes before the first.': 'El último día fuera es anterior al primero.',
  'A hand-over lasts {0} days at most. Write down a second one for the rest.':
    'Un relevo dura {0} días como máximo. Anota otro para el resto.',
  'The first day away is today or later.': 'El primer día fuera es hoy o más tarde.',
  'Write down at most {0} days ahead.': 'Anota con {0} días de antelación como máximo.',
  'These days overlap with another hand-over. Take that one back first.':
    'Estos días coinciden con otro relevo. Retira antes el otro.',
  'Only whoever is asked to look after the pool can agree to it.': 'Solo puede aceptar quien recibe la piscina.',
  'This hand-over is over, was taken back, or is not of this household.':
    'Este relevo ya terminó, se retiró o no es de este hogar.',
  'Ask for what is older than an entry by its number.': 'Pide lo anterior a una anotación por su número.',
};

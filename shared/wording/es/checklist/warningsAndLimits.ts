/** What a checklist says, in Spanish: the warnings (ANSI Z535 signal words: will, could) and the sums behind limits. */
export const warningsAndLimits = {
  'checklist.warning.live-until-proven':
    'Este tablero está vivo hasta que usted pruebe lo contrario. Si lo toca, lo matará.',
  'checklist.warning.no-load-break':
    '{tag} no corta carga. Si hay corriente, el arco lo matará o lo quemará.',
  'checklist.warning.stand-aside': 'Un arco podría quemarlo o matarlo. Póngase a un lado y aparte la cara.',
  'checklist.warning.tag-only': 'Una tarjeta no sujeta {tag}. Alguien podría cerrarlo y matarlo.',
  'checklist.warning.touch-nothing': 'Lo que hay tras la puerta lo matará si lo toca. No toque nada aún.',
  'checklist.warning.stays-live': 'Esto sigue vivo a {V} V: {place}. Si lo toca, lo matará.',
  'checklist.warning.stays-live-low': 'Esto sigue vivo a {V} V: {place}. Un corto podría quemarlo.',
  'checklist.warning.stored-energy':
    'La energía acumulada podría aplastar o matar: {what}. No se ponga en su camino.',
  'checklist.warning.stored-charge': '{supply} podría guardar su carga y darle una descarga mortal.',
  'checklist.warning.charged-bank':
    'Un corto en {supply} podría quemarlo gravemente. Descárguelo con una resistencia.',
  'checklist.warning.back-feed': 'La energía de otro lugar podría volver a {terminal} y matarlo.',
  'checklist.warning.try-start': 'Si un bloqueo falla, la máquina podría arrancar y matar. Aléjese.',
  'checklist.warning.diode-reversed': 'Un diodo al revés es un corto. Quema la salida.',
  'checklist.warning.insulation':
    'La prueba pone {V} V en el hilo. Podría dar una descarga mortal. Que nadie lo toque.',
  'checklist.warning.energised': 'El tablero está vivo. Si toca una parte desnuda, lo matará.',
  'checklist.warning.live-measuring': 'Estos bornes están vivos a {V} V. Si toca uno, lo matará.',
  'checklist.warning.energy-returns':
    '{tag} deja volver la energía. Lo que se mueve podría aplastar o matar.',
  'checklist.warning.motion-returns':
    '{tag} alimenta cosas que se mueven. Podrían arrancar y aplastar o matar.',
  'checklist.warning.movement': '{device} podría moverse y aplastar o matar. Que nadie meta las manos.',
  'checklist.warning.motion': 'Lo que se mueve aplastará o matará a quien esté dentro. Sáquelos.',
  'checklist.why.lowest': 'La prueba vale hasta {V} V: el medidor debe mostrar menos.',
  'checklist.why.no-load-break': '{tag} solo se abre con 0 A.',
  'checklist.why.about': 'De la mitad al doble de {V} V.',
  'checklist.why.stored-unknown': '{supply} cuenta como cargada hasta que marque cerca de 0 V.',
  'checklist.why.fuse': 'El fusible {fuse} es de {A} A en el archivo del tablero.',
  'checklist.why.fuse-most': 'No más de {A} A.',
  'checklist.why.bleeder': '{ohm} ohmios, 5 % más o menos.',
  'checklist.why.loop': '2 × {m} m × {perKm} ohm/km = {ohm} ohm a 20 °C; 20 % o 0.5 ohm más o menos.',
  'checklist.why.insulation': 'Con {V} V, al menos {Mohm} Mohm.',
  'checklist.why.supply': '{supply}: {V} V, de {minPct} % a +{maxPct} %.',
  'checklist.why.input-on': '{V} V × {factor} − {drop} V aparato − {cable} V cable.',
  'checklist.why.input-off': 'La entrada está inactiva con seguridad hasta {V} V.',
  'checklist.why.output-on': '{V} V × {factor} − {drop} V salida − {cable} V cable.',
  'checklist.why.output-off': '{percent} % de {V} V: por encima la carga puede quedar activa.',
  'checklist.why.point-current': 'La salida admite {A} A.',
  'checklist.why.signal': 'El rango de {signal}.',
} as const;

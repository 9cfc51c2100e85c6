export const outputs = {
  'finding.output.triac-on-dc.title': 'Salida de triac en CC',
  'finding.output.triac-on-dc':
    '{module} conmuta con triacs y {supply} es CC. Una vez activada, la salida no puede apagarse.',
  'remedy.output.triac-on-dc': 'Use una salida de relé o de transistor, o alimente el grupo con CA.',

  'finding.output.switches-neutral.title': 'Salida en el neutro',
  'finding.output.switches-neutral':
    'El borne {terminal} conmuta el neutro de {supply}. Su carga sigue con tensión cuando está apagada.',
  'remedy.output.switches-neutral': 'Conecte el común de {group} a la fase y la carga al neutro.',

  'finding.output.leakage-holds.title': 'La fuga mantiene la carga',
  'finding.output.leakage-holds.moves':
    'Apagada, {leakmA} mA dejan {offV} V en {load}. Suelta por debajo de {limitV} V: puede seguir activada o moverse.',
  'finding.output.leakage-holds.stays':
    'Apagada, {leakmA} mA dejan {offV} V en {load}. Se apaga por debajo de {limitV} V: puede seguir activada.',
  'remedy.output.leakage-holds': 'Ponga {ohm} ohm, {W} W en paralelo con la carga. Nunca con la salida.',
  'remedy.output.leakage-holds.relay':
    'Use una salida de relé o intercale un relé pequeño. Una resistencia se calentaría demasiado.',

  'finding.output.ssr-load.title': 'Lado de carga de un relé de estado sólido',
  'finding.output.ssr-load.ac-on-dc':
    'El relé {relay} es para CA y {supply} es CC. Una vez activado, no puede apagarse.',
  'finding.output.ssr-load.dc-on-ac': 'El relé {relay} es para CC y {supply} es CA.',
  'finding.output.ssr-load.volts': '{supply} llega a {V} V. El relé {relay} admite {ratedV} V.',
  'finding.output.ssr-load.amps': 'La carga toma {A} A. El relé {relay} soporta {ratedA} A.',
  'finding.output.ssr-load.reversed':
    'El lado de carga del relé {relay} está dibujado con el positivo en el negativo.',
  'remedy.output.ssr-load.ac-on-dc': 'Use un relé con salida de CC.',
  'remedy.output.ssr-load.dc-on-ac': 'Use un relé con salida de CA.',
  'remedy.output.ssr-load.volts': 'Use un relé para más tensión.',
  'remedy.output.ssr-load.amps': 'Use un relé para más corriente.',
  'remedy.output.ssr-load.reversed': 'Intercambie los dos hilos del lado de carga.',

  'finding.output.phase-mixed.title': 'Fases mezcladas en un módulo',
  'finding.output.phase-mixed':
    'En {module} puede haber {V} V entre los comunes {first} y {second}. El módulo separa {insulationV} V.',
  'remedy.output.phase-mixed':
    'Alimente ambos con una sola fase, use un módulo que separe {V} V, o un módulo para cada uno.',

  'finding.output.transistor-on-ac.title': 'Salida de transistor en CA',
  'finding.output.transistor-on-ac': '{module} conmuta con transistores y {supply} es CA. Se destruye.',
  'remedy.output.transistor-on-ac': 'Use una salida de relé o de triac, o alimente el grupo con CC.',

  'finding.output.polarity.title': 'Positivo y negativo intercambiados',
  'finding.output.polarity.common':
    'Las salidas de {what} conmutan el otro polo: el común {common} está en el polo equivocado de {supply}.',
  'finding.output.polarity.load':
    'La carga {what} en {terminal} está dibujada con el positivo en el negativo.',
  'finding.output.polarity.pole':
    'La carga de {what} vuelve al polo que conmuta la propia salida. No recibe tensión.',
  'remedy.output.polarity.common':
    'Pase el común al otro polo: salidas que entregan corriente al positivo, las que la reciben a 0 V.',
  'remedy.output.polarity.load': 'Intercambie los dos hilos de la carga.',
  'remedy.output.polarity.pole': 'Conecte el otro extremo de la carga al otro polo.',

  'finding.output.earth-fault-starts.title': 'Un defecto a tierra la activa',
  'finding.output.earth-fault-starts.moves':
    'La salida conmuta los 0 V de {supply}, que están a tierra. Un defecto a tierra en el hilo {wire} arranca la carga.',
  'finding.output.earth-fault-starts.stays':
    'La salida conmuta los 0 V de {supply}, que están a tierra. Un defecto a tierra en el hilo {wire} activa la carga.',
  'remedy.output.earth-fault-starts':
    'Mida el aislamiento del hilo a tierra. Mejor: que la salida conmute el positivo.',

  'finding.output.point-current.title': 'Demasiada corriente para la salida',
  'finding.output.point-current': 'Las cargas toman {A} A. La salida soporta {limitA} A.',
  'remedy.output.point-current': 'Intercale un relé o use una salida para {A} A.',

  'finding.output.group-current.title': 'Demasiada corriente para el común',
  'finding.output.group-current':
    'Con todo activado, los {points} puntos del grupo toman {A} A. El común soporta {limitA} A.',
  'remedy.output.group-current': 'Pase cargas por {overA} A a otro común.',

  'finding.output.inrush.title': 'Punta de arranque demasiado alta',
  'finding.output.inrush.amps': 'Al conectar toma {A} A. La salida admite {limitA} A.',
  'finding.output.inrush.time':
    'Al conectar toma {A} A durante {ms} ms. La salida admite {limitA} A durante {limitMs} ms.',
  'remedy.output.inrush': 'Intercale un relé que admita {A} A, o use una salida que los admita.',

  'finding.output.contact-dc.title': 'Contacto débil para la bobina de CC',
  'finding.output.contact-dc': 'La bobina toma {A} A a {V} V CC. El contacto corta {limitA} A.',
  'remedy.output.contact-dc': 'Use un contacto o una salida de transistor para {A} A a {V} V CC.',
  'finding.output.contact-ac.title': 'Contacto débil para la bobina de CA',
  'finding.output.contact-ac':
    'A {V} V CA la bobina toma {makesA} A y luego {A} A. El contacto cierra {makeLimitA} A y corta {limitA} A.',
  'remedy.output.contact-ac': 'Intercale un relé o use un contacto para {A} A a {V} V CA.',

  'finding.output.voltage-window.title': 'Alimentación fuera de lo que admite la salida o la carga',
  'finding.output.voltage-window.high': '{supply} llega a {V} V. Las salidas de {module} admiten {limitV} V.',
  'finding.output.voltage-window.low':
    '{supply} baja a {V} V. Las salidas de {module} necesitan {limitV} V para conmutar del todo.',
  'finding.output.voltage-window.load-high': '{supply} llega a {V} V. La carga {load} admite {limitV} V.',
  'finding.output.voltage-window.load-kind':
    'La carga {load} es para la otra clase de corriente que {supply} ({V} V, límite {limitV} V).',
  'remedy.output.voltage-window': 'Use un módulo para esta alimentación o una alimentación para este módulo.',
  'remedy.output.voltage-window.load': 'Use una carga para esta alimentación.',

  'finding.output.no-suppression.title': 'Bobina sin supresor',
  'finding.output.no-suppression.dc': 'Nada absorbe el pico de la bobina de CC {load}.',
  'finding.output.no-suppression.ac': 'Nada absorbe el pico de la bobina de CA {load}.',
  'remedy.output.no-suppression.dc':
    'Ponga un diodo de {V} V y {A} A en la bobina, cátodo al positivo. Hace más lento el desenganche. Si eso importa: un TVS de {standOffV} V.',
  'remedy.output.no-suppression.ac':
    'Ponga de {lowOhm} a {highOhm} ohm con {lowUF} a {highUF} µF en la bobina, o un varistor de {movV} V CA.',

  'finding.output.wrong-suppression.title': 'Supresor inadecuado',
  'finding.output.wrong-suppression.diode-on-ac':
    'Un diodo en {V} V CA es un cortocircuito cada dos semiondas, en {terminal}.',
  'finding.output.wrong-suppression.diode-at-contact':
    'Un diodo en paralelo con el contacto en {terminal} no frena el pico ({V} V CC).',
  'finding.output.wrong-suppression.diode-volts':
    'El diodo en {terminal} bloquea {value} V. Necesita {low} V como mínimo, mejor {wanted} V.',
  'finding.output.wrong-suppression.diode-amps':
    'El diodo en {terminal} soporta {value} A. La bobina hace pasar {low} A.',
  'finding.output.wrong-suppression.stand-off':
    'El supresor en {terminal} empieza a conducir a {value} V. La alimentación llega a {low} V.',
  'finding.output.wrong-suppression.varistor':
    'El varistor en {terminal} es de {value} V. Necesita {low} V como mínimo.',
  'finding.output.wrong-suppression.rc-volts':
    'El condensador en {terminal} es de {value} V CA. La alimentación llega a {low} V.',
  'finding.output.wrong-suppression.rc-ohm':
    'El RC en {terminal} tiene {value} ohm. Debería tener de {low} a {high} ohm.',
  'finding.output.wrong-suppression.rc-farad':
    'El RC en {terminal} tiene {value} µF. Debería tener de {low} a {high} µF.',
  'remedy.output.wrong-suppression.diode-on-ac': 'Ponga en su lugar un RC o un varistor para {V} V CA.',
  'remedy.output.wrong-suppression.diode-at-contact': 'Ponga el diodo en la bobina ({V} V CC).',
  'remedy.output.wrong-suppression.diode-volts':
    'Ponga un diodo de {wanted} V, mínimo {low} V, no de {value} V.',
  'remedy.output.wrong-suppression.diode-amps': 'Ponga un diodo de {low} A, no de {value} A.',
  'remedy.output.wrong-suppression.stand-off': 'Ponga uno con tensión de reposo de {low} V, no de {value} V.',
  'remedy.output.wrong-suppression.varistor': 'Ponga un varistor de {low} V CA, no de {value} V.',
  'remedy.output.wrong-suppression.rc-volts': 'Ponga un condensador de {low} V CA, no de {value} V.',
  'remedy.output.wrong-suppression.rc-ohm': 'Ponga de {low} a {high} ohm, no {value} ohm.',
  'remedy.output.wrong-suppression.rc-farad': 'Ponga de {low} a {high} µF, no {value} µF.',

  'finding.output.suppressor-reversed.title': 'Supresor al revés',
  'finding.output.suppressor-reversed':
    'El supresor en {terminal} está dibujado al revés. Es un cortocircuito al activar la salida.',
  'remedy.output.suppressor-reversed': 'Gírelo: cátodo (la banda) al positivo.',

  'finding.output.min-load.title': 'Carga demasiado pequeña',
  'finding.output.min-load': 'La carga toma {mA} mA. La salida necesita {leastmA} mA.',
  'remedy.output.min-load': 'Ponga {ohm} ohm, {W} W en paralelo con la carga.',
  'remedy.output.min-load.relay':
    'Use una salida para cargas pequeñas. Una resistencia se calentaría demasiado.',

  'finding.output.load-underfed.title': 'Poca tensión en la carga',
  'finding.output.load-underfed': 'A {load} le llegan {V} V. Se activa a partir de {needsV} V.',
  'remedy.output.load-underfed':
    'Faltan {lackV} V. Use un cable más grueso o más corto, o una alimentación más estable.',

  'finding.output.ssr-control.title': 'Lado de mando de un relé de estado sólido',
  'finding.output.ssr-control.low': 'El relé {relay} recibe {V} V. Necesita {limitV} V para activarse.',
  'finding.output.ssr-control.high': 'El relé {relay} recibe {V} V. Admite {limitV} V.',
  'finding.output.ssr-control.ac':
    'El relé {relay} tiene mando de CC y recibe CA ({V} V, hecho para {limitV} V CC).',
  'remedy.output.ssr-control.low': 'Use un relé que se active con menos tensión, o un cable más grueso.',
  'remedy.output.ssr-control.high': 'Use un relé para esta tensión de mando.',
  'remedy.output.ssr-control.ac': 'Use un relé con mando de CA.',

  'finding.output.ssr-heat.title': 'Relé de estado sólido sin disipador',
  'finding.output.ssr-heat': 'El relé {relay} lleva {A} A y no consta ningún disipador.',
  'remedy.output.ssr-heat': 'Busque el disipador e indíquelo en el archivo del cuadro.',
} as const;

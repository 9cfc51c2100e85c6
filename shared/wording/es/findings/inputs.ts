export const inputs = {
  'finding.input.npn-on-sinking.title': 'Sensor NPN con el común a 0 V',
  'finding.input.npn-on-sinking':
    '{device} es NPN: conmuta a 0 V. El común {common} también está a 0 V y no puede circular corriente.',
  'finding.input.npn-on-sinking.remedy':
    'Use un sensor PNP para {device}, o un grupo con el común a positivo, no {group}.',
  'finding.input.pnp-on-sourcing.title': 'Sensor PNP con el común a positivo',
  'finding.input.pnp-on-sourcing':
    '{device} es PNP: conmuta a positivo. El común {common} también está a positivo y no puede circular corriente.',
  'finding.input.pnp-on-sourcing.remedy':
    'Use un sensor NPN para {device}, o un grupo con el común a 0 V, no {group}.',
  'finding.input.mixed-on-common.title': 'Sensores NPN y PNP en un común',
  'finding.input.mixed-on-common':
    'El común {common} tiene sensores NPN ({npn}) y PNP ({pnp}). Una de las dos clases no puede funcionar.',
  'finding.input.mixed-on-common.remedy': 'Ponga cada clase en un común propio.',
  'finding.input.led-reversed.title': 'Entrada conectada al revés',
  'finding.input.led-reversed':
    'Esta entrada conduce en un solo sentido. Con el común {common} a {pole} queda inactiva.',
  'finding.input.led-reversed.breaks':
    'Esta entrada conduce en un solo sentido. Con el común {common} a {pole} recibe tensión inversa y se avería.',
  'finding.input.led-reversed.remedy': 'Ponga el común del grupo {group} en el otro polo.',
  'finding.input.namur.title': 'Sensor NAMUR en una entrada corriente',
  'finding.input.namur': '{device} es un sensor NAMUR. Una entrada corriente no lo puede leer.',
  'finding.input.namur.remedy': 'Intercale un amplificador NAMUR, o use otro sensor.',
  'finding.input.dc-sensor-on-ac.title': 'Sensor de continua en alterna',
  'finding.input.dc-sensor-on-ac': '{device} está hecho para continua, pero {supply} da alterna.',
  'finding.input.dc-sensor-on-ac.remedy': 'Use un sensor de alterna, o alimentación y entrada de continua.',
  'finding.input.ac-sensor-on-dc.title': 'Sensor de alterna en continua',
  'finding.input.ac-sensor-on-dc': '{device} está hecho para alterna, pero {supply} da continua.',
  'finding.input.ac-sensor-on-dc.remedy': 'Use un sensor de continua, o alimentación y entrada de alterna.',
  'finding.input.never-on.title': 'La entrada nunca se activa',
  'finding.input.never-on':
    'Con su aparato accionado, el borne {terminal} recibe {V} V en el peor caso. La entrada sigue inactiva.',
  'finding.input.never-off.title': 'La entrada nunca se desactiva',
  'finding.input.never-off.open':
    'Con su aparato en reposo, el borne {terminal} aún tiene {V} V. La entrada sigue activa.',
  'finding.input.undefined.title': 'Entrada entre activa e inactiva',
  'finding.input.undefined':
    'Con su aparato accionado, el borne {terminal} recibe {V} V en el peor caso. No es ni activa ni inactiva.',
  'finding.input.undefined.open':
    'Con su aparato en reposo, el borne {terminal} aún tiene {V} V. No es ni activa ni inactiva.',
  'finding.input.overcurrent.title': 'Demasiada corriente',
  'finding.input.overcurrent': 'La entrada lleva {mA} mA con la alimentación más alta. Soporta {maxmA} mA.',
  'finding.input.overcurrent.sensor':
    'El sensor debe llevar {mA} mA con la alimentación más alta. Soporta {maxmA} mA.',
  'finding.input.overcurrent.remedy': 'Añada {ohm} ohm o más en serie con la entrada.',
  'finding.input.resistor-hot.title': 'Resistencia demasiado caliente',
  'finding.input.resistor-hot.series':
    'La resistencia en serie disipa {heat} W. Más de la mitad de sus {W} W es demasiado.',
  'finding.input.resistor-hot.bleeder':
    'La resistencia en paralelo con la entrada disipa {heat} W. Más de la mitad de sus {W} W es demasiado.',
  'finding.input.resistor-hot.remedy': 'Monte una resistencia de {W} W.',
  'finding.input.leakage.title': 'La corriente de fuga mantiene la entrada',
  'finding.input.leakage':
    'El sensor deja pasar {mA} mA en reposo. El borne {terminal} tiene entonces {V} V y no se lee inactivo.',
  'finding.input.leakage.unsure':
    'El sensor deja pasar {mA} mA en reposo. Que la entrada se lea inactiva depende de {field}, que falta.',
  'finding.input.cable-capacitance.title': 'Un cable largo en alterna mantiene la entrada',
  'finding.input.cable-capacitance':
    'Con el contacto abierto, {m} m de cable ponen {V} V en el borne {terminal}. No se lee inactivo.',
  'finding.input.min-load.title': 'Poca corriente para el sensor',
  'finding.input.min-load':
    '{device} recibe {mA} mA cuando está activo. Necesita {minmA} mA para seguir activo.',
  'finding.input.two-wire-in-series.title': 'Sensores de dos hilos en serie',
  'finding.input.two-wire-in-series':
    '{count} sensores de dos hilos en serie dejan {V} V a la entrada. No se lee activa.',
  'finding.input.two-wire-in-series.remedy':
    'Dé a cada sensor una entrada propia, o use sensores de tres hilos.',
  'finding.input.not-saturated.title': 'El optoacoplador no conmuta del todo',
  'finding.input.not-saturated':
    'El optoacoplador envejecido lleva {has} mA con la alimentación más baja. Debe llevar {needs} mA.',
  'finding.input.not-saturated.remedy':
    'Dé al LED {mA} mA o más: una alimentación más alta o una resistencia en serie menor.',
  'finding.input.earth-fault-on.title': 'Un fallo a tierra se lee como activa',
  'finding.input.earth-fault-on':
    'Un fallo a tierra en el hilo {wire} se lee como activa, pues {supply} está puesta a tierra.',
} as const;

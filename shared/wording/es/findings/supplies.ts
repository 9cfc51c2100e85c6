export const supplies = {
  'finding.supply.missing.title': 'Común sin alimentación',
  'finding.supply.missing': 'Nadie ha indicado qué alimentación llega al común {common} ({field}).',
  'finding.supply.missing.unknown':
    'El común {common} nombra la alimentación {supply}, que este cuadro no tiene.',
  'finding.supply.logic-feeds-field.title': 'La alimentación del autómata alimenta el campo',
  'finding.supply.logic-feeds-field':
    'El común {common} cuelga de {supply}, la alimentación del propio autómata. Un fallo en el campo lo para.',
  'finding.supply.logic-feeds-field.remedy': 'Alimente este común desde una alimentación de campo.',
  'finding.supply.kind.title': 'Alterna en continua, o al revés',
  'finding.supply.kind': '{supply} da {fed}; el módulo {module} no está hecho para ella.',
  'finding.supply.kind.pole': 'El común {common} figura como {pole}, pero {supply} da {fed}.',
  'finding.supply.kind.remedy': 'Use una alimentación o un módulo de la otra clase.',
  'finding.supply.level-high.title': 'Alimentación demasiado alta',
  'finding.supply.level-high': '{supply} puede subir a {V} V. El módulo {module} soporta {most} V.',
  'finding.supply.level-high.remedy':
    'Mantenga la alimentación en {V} V o menos, o indique lo que soporta el módulo.',
  'finding.supply.level-low.title': 'Alimentación demasiado baja',
  'finding.supply.level-low': '{supply} puede bajar a {V} V. El módulo {module} necesita {least} V.',
  'finding.supply.level-low.remedy': 'Mantenga la alimentación en {V} V o más.',
  'finding.supply.no-tolerance.title': 'Límites de la alimentación sin indicar',
  'finding.supply.no-tolerance': 'Nadie ha indicado cuánto puede subir y bajar {supply} ({field}).',
  'finding.supply.overload.title': 'Alimentación sobrecargada',
  'finding.supply.overload': 'Con todo activado, {supply} debe dar {A} A. Su valor asignado es {ratedA} A.',
  'finding.supply.overload.remedy': 'Use una alimentación de {A} A o más, o reparta las cargas.',
  'finding.supply.two-on-one-common.title': 'Dos alimentaciones en un común',
  'finding.supply.two-on-one-common':
    'Los grupos {groups} comparten el borne {common} pero nombran alimentaciones distintas ({supplies}). Con una abierta, la otra lo mantiene con tensión.',
  'finding.supply.two-on-one-common.poles':
    'Los grupos {groups} comparten el borne {common} pero le ponen polos distintos de {supplies}. Es un cortocircuito.',
  'finding.supply.two-on-one-common.remedy': 'Dé a cada alimentación un común propio.',
  'finding.supply.commons-bridged.title': 'Comunes de dos alimentaciones puenteados',
  'finding.supply.commons-bridged':
    'Los comunes {groups} están puenteados pero cuelgan de alimentaciones distintas ({supplies}). Con una abierta, la otra los mantiene con tensión.',
  'finding.supply.commons-bridged.poles':
    'Los comunes {groups} están puenteados pero en polos distintos de {supplies}. Es un cortocircuito.',
  'finding.supply.commons-bridged.remedy': 'Quite el puente, o alimente igual todos los comunes puenteados.',
  'finding.supply.mixed-bands.title': 'Muy baja tensión y baja tensión juntas',
  'finding.supply.mixed-bands.terminals':
    '{low} y {high} ({V} V) están una al lado de otra en {place}. El módulo está aislado solo para {insulationV} V.',
  'finding.supply.mixed-bands.terminals.remedy': 'Use un módulo aislado para {V} V, o sepárelas.',
  'finding.supply.mixed-bands.cable':
    '{low} y {high} ({V} V) van en un mismo cable, {place}. Está aislado solo para {insulationV} V.',
  'finding.supply.mixed-bands.cable.remedy': 'Use un cable aislado para {V} V, o dos cables.',
  'finding.supply.unearthed-control.title': 'Alimentación de mando sin tierra ni vigilante',
  'finding.supply.unearthed-control':
    '{supply} no está puesta a tierra y nada la vigila. El primer fallo a tierra pasa sin verse; el segundo puede poner algo en marcha.',
  'finding.supply.unearthed-control.remedy': 'Ponga un polo a tierra, o monte un vigilante de aislamiento.',
  'finding.group.fuse-missing.title': 'Grupo de salidas sin fusible',
  'finding.group.fuse-missing':
    'No consta ningún fusible entre {supply} y las salidas del grupo {group}. Un cortocircuito quema los hilos.',
  'finding.group.fuse-missing.remedy':
    'Monte un fusible antes del común, o indique la protección de la alimentación.',
  'finding.group.fuse-missing.remedy.most':
    'Monte un fusible de {A} A o menos antes del común, o indique la protección de la alimentación.',
} as const;

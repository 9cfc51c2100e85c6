export const isolation = {
  'isolation.none':
    'No existe una consignación segura: con todo abierto, {place} sigue con tensión ({path}){places, plural, =0 {} one {} other {, uno de # lugares}}.',
  'isolation.no-feed': 'Nadie ha indicado qué alimenta {supply}. Se considera siempre con tensión.',
  'isolation.derived-loop':
    '{supplies} se alimentan entre sí y ninguna fuente las alimenta. Se consideran siempre con tensión.',
  'isolation.one-pole':
    '{isolator} abre un solo conductor y es el único medio para {supply}. El otro conductor puede seguir con tensión.',
  'isolation.control-device-as-isolator':
    '{isolator} es un aparato de mando, o no es apto para seccionar, y es el único medio para {supply}.',
  'isolation.other-energy': '{source} ({description}) no tiene ningún aparato que la retenga.',
  'isolation.single-point-cannot-lock':
    '{isolator} ({location}) no admite candado. Necesita etiqueta y una medida más.',
  'isolation.foreign-voltage': '{supply} llega al borne {terminal} desde otro circuito.',
  'isolation.foreign-voltage.stays.iec':
    '{supply} llega al borne {terminal} y sigue con tensión con el seccionador abierto. Sus hilos deberían ser naranjas (IEC 60204-1).',
  'isolation.foreign-voltage.stays.nfpa':
    '{supply} llega al borne {terminal} y sigue con tensión con el seccionador abierto. Sus hilos deberían ser amarillos o naranjas (NFPA 79).',
  'isolation.stored-unknown': '{supply} almacena carga y nadie sabe cuánto dura. Mídala.',
  'isolation.redundant-feed':
    '{supply} tiene {feeds} alimentaciones. Solo queda sin tensión con todas abiertas.',
  'isolation.ups': '{source} ({location}) es una batería. Alimenta aunque falte la red.',
  'isolation.not-in-sight': '{isolator} ({location}) no se ve desde el cuadro.',
  'isolation.no-load-break':
    '{isolator} ({location}) no debe cortar en carga. Ábralo solo cuando su corriente marque 0.',
  'isolation.same-tag-differs':
    'El cuadro {panel} describe {isolator} de otra manera. Compruebe que es el mismo aparato.',
  'isolation.remedy.none':
    'Añada a ese camino un aparato con candado, o complete los datos que faltan en el archivo del cuadro.',
  'isolation.remedy.no-feed':
    'Indique la fuente o el circuito que alimenta {supply} y los aparatos intermedios.',
  'isolation.remedy.derived-loop': 'Indique la fuente que alimenta uno de ellos.',
  'isolation.remedy.one-pole': 'Ponga antes de {isolator} un aparato que abra todos los conductores activos.',
  'isolation.remedy.control-device-as-isolator':
    'Ponga antes de {isolator} un seccionador o interruptor apto para seccionar.',
  'isolation.remedy.other-energy': 'Indique la válvula, el bloqueo o el pasador que retiene {source}.',
  'isolation.quantity.volts': 'Tensión',
  'isolation.quantity.capacitance': 'Carga almacenada, capacidad',
  'isolation.quantity.feeds': 'Alimentaciones',
  'isolation.incoming': 'bornes de entrada de {isolator}',
} as const;

export const check = {
  'check.panel':
    'Cuadro {panel}, {points, plural, one {# punto} other {# puntos}}. Reglas {ruleSet}. Huella {digest}.',
  'check.ran':
    '{checks, plural, one {# comprobación} other {# comprobaciones}}, {waiting, plural, =0 {todas posibles} one {# no fue posible} other {# no fueron posibles}}.',
  'check.waits': 'No fue posible: {rule} en {place}. Falta {missing}.',
  'check.no-findings': 'Las comprobaciones posibles no encontraron nada.',
  'check.sum': '{name} {value} {unit} ({basis})',
  'check.remedy': 'Haga esto: {remedy}',
  'check.plan': 'Abra y bloquee, en este orden: {isolators}.',
  'check.plan.nothing': 'No hay que abrir nada.',
  'check.no-plan': 'No existe una consignación segura. No puede empezar ningún trabajo en estos puntos.',
  'check.tell': 'Avise antes: {tell}.',
  'check.guarded': 'Sigue con tensión tras su protección: {supplies}.',
  'check.still-live': 'Sigue con tensión con {open} abierto:',
  'check.still-live.nothing-open': 'Con tensión sin abrir nada:',
  'check.dark': 'Nada queda con tensión con {open} abierto.',
  'check.live': '{place}: {V} V por {path}',
  'check.maybe-live': '{place}: puede tener tensión, {V} V por {path}',
  'check.dead-tests': '{count, plural, one {# par} other {# pares}} por medir sin tensión.',
  'check.wait':
    '{supply}: espere {t60S} s antes de acercarse (60 V), {t1S} s hasta que debería estar sin tensión.',
  'check.wait.stated': '{supply}: espere {statedS} s, según su fabricante.',
  'check.wait.unknown': '{supply}: almacena carga y no se sabe cuánto dura. Mídala.',
  'check.steps': '{steps, plural, one {# paso} other {# pasos}} en la lista.',
  'check.stage': '{stage}: {steps}',
} as const;

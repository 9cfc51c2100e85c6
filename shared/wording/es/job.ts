/** Por qué se rechaza un paso, una firma o un sello, y qué no puede ser cierto a la vez. */
export const job = {
  'job.gate.not-on-job': 'No estás en este trabajo como electricista.',
  'job.gate.not-accepted': 'Primero acepta el trabajo.',
  'job.gate.cancelled': 'Este trabajo fue anulado.',
  'job.gate.unknown-step': 'Este paso no está en la lista de este trabajo.',
  'job.gate.held': 'Alguien no pudo hacer este paso. Espera al encargado.',
  'job.gate.stopped': 'El trabajo está parado. Alguien no pudo hacer este paso: {step}',
  'job.gate.contradiction': 'Dos avisos no pueden ser ciertos a la vez. {what}',
  'job.gate.unreadable': 'Esta aplicación no puede leer todo lo enviado. Primero actualiza la aplicación.',
  'job.gate.isolation-over':
    'Se están quitando los candados o ha vuelto la tensión. Primero empieza otra ronda.',
  'job.gate.danger': 'Una lectura no estaba sin tensión. Primero vuelve a medir: {step}',
  'job.gate.order': 'Primero haz este paso: {step}',
  'job.gate.own-locks': 'Tu propio candado debe estar puesto en {isolators}.',
  'job.gate.own-tests':
    'Primero comprueba tú la ausencia de tensión. {n, plural, =0 {} one {Falta una lectura.} other {Faltan # lecturas.}}',
  'job.gate.own-terminal': 'Primero mide tú sin tensión los bornes de {point}.',
  'job.gate.point-held': 'El punto {point} espera al encargado.',
  'job.gate.temporaries':
    '{n, plural, one {Queda un cambio provisional} other {Quedan # cambios provisionales}} en el cuadro. Primero corrígelo.',
  'job.gate.no-own-lock': 'No tienes candado en {isolator}.',
  'job.gate.locked': 'El candado {lock} de {name} sigue puesto en {isolator}.',
  'job.gate.not-clear': 'Estas personas no han dicho que están fuera: {names}.',
  'job.gate.wrong-kind': 'Esto no responde a este paso.',
  'job.gate.lock-elsewhere': 'El candado {lock} ya está en {other}. No puede estar también en {isolator}.',
  'job.gate.not-that-lock': 'No tienes el candado {lock} en {isolator}.',
  'job.gate.not-watched': 'La lectura observada no es de esta ronda, o es otra.',
  'job.sign.not-on-job': 'No estás en este trabajo como electricista.',
  'job.sign.cancelled': 'Este trabajo fue anulado.',
  'job.sign.already-countersigned': 'Este trabajo está refrendado.',
  'job.sign.unsettled': 'Este paso sigue abierto: {step}',
  'job.sign.contradiction': 'Dos avisos no pueden ser ciertos a la vez. {what}',
  'job.sign.unreadable': 'Esta aplicación no puede leer todo lo enviado. Primero actualiza la aplicación.',
  'job.sign.lock-on': 'El candado {lock} de {name} sigue puesto en {isolator}.',
  'job.sign.not-read': 'Primero haz esto: {step}',
  'job.sign.nothing': 'No te queda nada por firmar.',
  'job.sign.not-foreman': 'No eres el encargado de este trabajo.',
  'job.sign.took-part': 'Participaste en este trabajo. Debe refrendarlo otro encargado.',
  'job.sign.not-signed': 'No todas las respuestas están firmadas por quien las dio.',
  'job.sign.changed': 'Nula: este paso cambió después de la firma: {step}',
  'job.sign.earlier-state': 'Refrendó un estado anterior. Llegó algo después. Firma otra vez.',
  'job.contradiction.closed-under-lock':
    '{isolator} se cerró mientras el candado {lock} de {name} podía estar puesto.',
  'job.contradiction.lock-twice': 'El candado {lock} consta en {isolator} y en {other}.',
  'job.contradiction.two-contents': 'Un aviso llegó en dos versiones.',
  'job.seal.not-countersigned': 'El trabajo no está refrendado, o llegó algo después.',
  'job.seal.unsettled': 'Este paso sigue abierto: {step}',
  'job.seal.not-signed': 'No todas las respuestas están firmadas por quien las dio.',
  'job.seal.same-person': '{name} trabajó en este trabajo y lo refrendó.',
  'job.seal.lock-on': 'El candado {lock} de {name} sigue puesto en {isolator}.',
  'job.seal.contradiction': 'Dos avisos no pueden ser ciertos a la vez. {what}',
  'job.seal.gap':
    '{n, plural, one {Un teléfono tiene} other {# teléfonos tienen}} avisos que nunca llegaron.',
  'job.seal.unreadable': 'Hay avisos de una clase que esta versión no puede leer.',
  'job.seal.set-aside':
    '{n, plural, one {Hay un aviso apartado} other {Hay # avisos apartados}} sin decidir.',
  'job.seal.bad-signature':
    '{n, plural, one {Un aviso tiene} other {# avisos tienen}} una firma que no corresponde a su clave.',
  'job.seal.key':
    '{n, plural, one {Un aviso se firmó} other {# avisos se firmaron}} con una clave que entonces no valía.',
  'job.seal.pack':
    '{n, plural, one {Un aviso responde} other {# avisos responden}} a una lista que nunca se emitió.',
  'job.seal.digest': '{n, plural, one {Una firma cubre} other {# firmas cubren}} otra cosa que lo mostrado.',
  'job.seal.photo':
    '{n, plural, one {Falta una foto que no está} other {Faltan # fotos que no están}} {n, plural, one {dada} other {dadas}} de baja.',
  'job.seal.log-open': 'Puede que no haya llegado todo de {names}.',
  'job.seal.other-phone':
    'El refrendo se hizo en el teléfono de otra persona. El encargado debe confirmarlo.',
  'job.seal.refused-lock': 'No consta que el seccionador {isolator} esté cerrado.',
} as const;

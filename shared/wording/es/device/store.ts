export const store = {
  'device.store.error.unreachable': 'El servidor no respondió.',
  'device.store.error.busy':
    'El servidor está ocupado o en reparación. Este dispositivo lo intenta de nuevo por sí solo.',
  'device.store.error.update-app':
    'El servidor responde de un modo que esta versión no conoce. Use la versión más nueva.',
  'device.store.error.bad-pack': 'Un trabajo llegó dañado y no se tomó. Busque trabajos de nuevo.',
  'device.store.error.not-acknowledged': 'El servidor no dijo que tiene las respuestas. Se quedan aquí.',
  'device.store.error.refused': 'El servidor no tomó una respuesta: {says}',
  'device.store.error.store': 'Falló el almacén de este dispositivo: {says}',
  'device.store.setAside': 'Espera la decisión del encargado.',
  'device.store.ready.shell.ok': 'La aplicación está en este dispositivo.',
  'device.store.ready.shell.missing':
    'La aplicación aún no está completa en este dispositivo. Necesita la red una vez.',
  'device.store.ready.shell.button': 'Traer la aplicación',
  'device.store.ready.pack.ok': 'El trabajo está completo en este dispositivo.',
  'device.store.ready.pack.missing': 'El trabajo no está completo en este dispositivo.',
  'device.store.ready.pack.button': 'Traer el trabajo',
  'device.store.ready.pin.ok': 'Hay un PIN puesto.',
  'device.store.ready.pin.missing': 'Nadie de este trabajo tiene un PIN en este dispositivo.',
  'device.store.ready.pin.button': 'Poner un PIN',
  'device.store.ready.storage.kept': 'El navegador ha prometido conservar lo guardado.',
  'device.store.ready.storage.accepted':
    'El navegador puede borrar lo guardado si falta espacio. Usted lo aceptó.',
  'device.store.ready.storage.ask': 'El navegador no ha prometido conservar lo guardado.',
  'device.store.ready.storage.ask.button': 'Pedirle que lo conserve',
  'device.store.ready.storage.warn':
    'El navegador se negó. Puede borrar respuestas sin enviar si falta espacio. Envíe a menudo.',
  'device.store.ready.storage.warn.button': 'Trabajar con ese riesgo',
  'device.store.ready.self-test.ok': 'El trabajo se abrió con la red negada.',
  'device.store.ready.self-test.missing': 'Esta versión aún no ha abierto el trabajo con la red negada.',
  'device.store.ready.self-test.button': 'Probarlo ahora',
  'device.store.ready.test.shell': 'La prueba falló: la aplicación no se abrió con la red negada.',
  'device.store.ready.test.pack': 'La prueba falló: el trabajo no está completo en este dispositivo.',
  'device.store.ready.test.fault':
    'La prueba falló: un paso del trabajo no se puede mostrar. Avise al encargado.',
  'device.store.support.title': 'Este navegador no sirve para el trabajo de campo',
  'device.store.support.what':
    'El trabajo de campo guarda respuestas en el dispositivo sin señal. Aquí eso no funciona:',
  'device.store.support.insecure': 'La página no llegó por HTTPS. Abra su dirección https://.',
  'device.store.support.keys': 'El navegador no tiene claves para firmar respuestas.',
  'device.store.support.database':
    'El navegador no tiene base de datos. Una ventana privada puede ser la causa.',
  'device.store.support.worker':
    'El navegador no puede guardar la aplicación. Una ventana privada puede ser la causa.',
  'device.store.support.old': 'El navegador es demasiado viejo. Actualícelo.',
} as const;

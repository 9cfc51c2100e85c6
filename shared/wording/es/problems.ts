export const problems = {
  'problem.invalid': 'Parte de lo enviado no se puede usar. No se cambió nada. Vea abajo cada lugar.',
  'problem.not-found': 'Esto no existe o no está en una de sus plantas.',
  'problem.forbidden': 'Sus funciones no permiten esto. No se cambió nada.',
  'problem.sign-in-needed':
    'Inicie sesión para seguir. Las respuestas de este dispositivo se quedan aquí hasta entonces.',
  'problem.wrong-sign-in':
    'El correo o la contraseña no son correctos. Inténtelo otra vez o pida una contraseña nueva.',
  'problem.too-many-tries': 'Demasiados intentos fallidos. Espere {minutes} minutos e inténtelo otra vez.',
  'problem.cross-site':
    'Esta petición vino de otra página y se rechazó. No se cambió nada. Abra Coldloop e inténtelo otra vez.',
  'problem.too-large': 'Esto es demasiado grande. No se cambió nada. Envíe un archivo más pequeño.',
  'problem.unreadable':
    'No se pudo leer. No se cambió nada. Compruebe que es el archivo correcto y que está entero.',
  'problem.stale':
    'Otra persona lo cambió mientras tanto. No se sobrescribió nada. Cárguelo de nuevo y haga su cambio.',
  'problem.email-taken': 'Ya existe una persona con este correo. No se cambió nada.',
  'problem.name-taken': 'Este nombre ya está en uso. Elija otro.',
  'problem.not-yourself': 'No puede quitarse esto a sí mismo. Pídalo a otro administrador.',
  'problem.token-ended': 'Este enlace ya se usó o es demasiado antiguo. Pida uno nuevo.',
  'problem.not-ready':
    'El servidor no llega a su base de datos en este momento. No se perdió nada. Inténtelo en unos segundos.',
  'problem.fault':
    'Algo falló en el servidor. No se guardó nada de esta petición. Inténtelo otra vez; si sigue, avise a su administrador.',
  'problem.id-taken':
    'Otra cosa ya lleva este identificador. No se cambió nada. Empiece de nuevo con uno nuevo.',
  'problem.tag-taken':
    'Ya existe un cuadro con esta marca en esta planta. No se cambió nada. Abra ese cuadro o cambie la marca.',
  'problem.not-issuable':
    'Este borrador aún no se puede emitir. No se cambió nada. Corrija cada lugar indicado abajo.',
  'problem.findings-stand':
    'Hay hallazgos que nadie ha aceptado. No se cambió nada. Corríjalos o acepte cada uno con un motivo.',
  'problem.job-blocked':
    'No se puede empezar un trabajo en estos puntos. No se cambió nada. Vea abajo cada motivo.',
  'problem.not-fit': 'Estas personas no pueden hacer este trabajo. No se cambió nada. Vea abajo cada motivo.',
  'problem.not-planned': 'Este trabajo ya se envió o ya terminó. No se cambió nada. Cárguelo de nuevo.',
  'problem.ended': 'Este trabajo ya terminó. No se cambió nada.',
  'problem.locks-on':
    'Un candado de este trabajo sigue puesto o no se sabe. No se cambió nada. Quite primero los candados.',
  'problem.busy': 'El servidor tiene mucho que hacer ahora. No se perdió nada. Inténtelo en unos segundos.',
  'problem.heads':
    'Al servidor le falta lo que va antes de estas entradas. No se perdió nada. Este dispositivo envía desde ahí.',
  'problem.unknown-key':
    'El servidor no conoce la clave de estas entradas. Se quedan en este dispositivo. Inicie sesión otra vez en él.',
  'problem.unknown-pack':
    'Estas entradas nombran una lista que nunca se entregó para este trabajo. Se quedan en este dispositivo.',
  'problem.bad-signature': 'Una firma no corresponde a su entrada. La entrada se queda en este dispositivo.',
  'problem.broken-log': 'Estas entradas no siguen una a otra. Se quedan en este dispositivo.',
  'problem.device-revoked':
    'Un administrador excluyó este dispositivo. Pregúntele antes de volver a trabajar con él.',
  'reason.no-points': 'No hay ningún punto elegido.',
  'reason.unknown-point': 'El punto {point} no está en esta revisión.',
  'reason.not-accepted': 'Acéptelo con un motivo o corríjalo.',
  'reason.nothing-to-accept': 'Ahí no hay ningún hallazgo de esta regla.',
  'reason.same-person': 'Un encargado que también trabaja no puede visar su trabajo. Elija a otra persona.',
  'reason.no-electrician': 'Esta persona no es electricista de esta planta.',
  'reason.no-foreman': 'Esta persona no es encargado de esta planta.',
} as const;

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
} as const;

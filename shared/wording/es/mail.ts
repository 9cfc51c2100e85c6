export const mail = {
  'mail.foot':
    'Coldloop ayuda a personas cualificadas a seguir y registrar un procedimiento. No sustituye las normas de su planta, la normativa local ni el criterio profesional autorizado.',
  'mail.invitation.subject': 'Tiene una invitación a Coldloop',
  'mail.invitation.body':
    'Hola, {name}.\n{by} le ha añadido a Coldloop. Ponga su contraseña con el enlace de abajo. Sirve una vez, durante 7 días.',
  'mail.invitation.action': 'Poner la contraseña',
  'mail.password-reset.subject': 'Ponga una contraseña nueva',
  'mail.password-reset.body':
    'Hola, {name}.\nAlguien pidió una contraseña nueva para esta dirección. Si fue usted, use el enlace de abajo. Sirve una vez, durante una hora. Si no, no haga nada: su contraseña sigue igual.',
  'mail.password-reset.action': 'Poner una contraseña nueva',
  'mail.job-given.subject': 'El trabajo {number} del cuadro {panel} es suyo',
  'mail.job-given.body':
    'Hola, {name}.\n{by} le ha dado el trabajo {number} del cuadro {panel}, para el {due}. Ábralo una vez con cobertura, para tenerlo en el teléfono en el sótano.',
  'mail.job-given.action': 'Abrir el trabajo',
  'mail.countersign-wanted.subject': 'El trabajo {number} del cuadro {panel} le espera',
  'mail.countersign-wanted.body':
    'Hola, {name}.\nEl trabajo {number} del cuadro {panel} está firmado. Léalo y luego refréndelo o devuélvalo.',
  'mail.countersign-wanted.action': 'Leer el trabajo',
  'mail.job-returned.subject': 'El trabajo {number} del cuadro {panel} ha vuelto',
  'mail.job-returned.body':
    'Hola, {name}.\n{by} devolvió el trabajo {number} del cuadro {panel}. Los pasos que hay que repetir están abiertos en su teléfono.',
  'mail.job-returned.action': 'Abrir el trabajo',
  'mail.record-sealed.subject': 'Registro {number}: cuadro {panel} sellado',
  'mail.record-sealed.body':
    'Hola, {name}.\nEl trabajo {job} del cuadro {panel} está firmado, refrendado y sellado como registro {number}.\nSello: {seal}\nGuarde este correo: prueba el registro fuera de la base de datos.',
  'mail.record-sealed.action': 'Abrir el registro',
  'mail.record-amended.subject': 'Enmienda {number}: tablero {panel}, trabajo {job}',
  'mail.record-amended.body':
    'Hola, {name}.\nLlegaron entradas del trabajo {job} en el tablero {panel} después de sellar su registro. Quedan selladas como enmienda {number}. Lea qué cambió: puede tratarse de un bloqueo, una retención o una lectura fuera de límites.\nSello: {seal}\nGuarde este correo: prueba el registro fuera de la base de datos.',
  'mail.record-amended.action': 'Leer la enmienda',
  'mail.key-registered.subject': 'Su clave de firma se creó en un dispositivo',
  'mail.key-registered.body':
    'Hola, {name}.\nSe creó una clave de firma a su nombre en el dispositivo «{device}». Si no fue usted, avise ahora a su administrador.',
  'mail.key-registered.action': 'Abrir este dispositivo',
} as const;

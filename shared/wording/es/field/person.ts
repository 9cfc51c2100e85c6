export const person = {
  'field.who.sheet': '¿Quién está aquí?',
  'field.who.title': '¿Quién es usted?',
  'field.who.nobody': 'Aún no hay nadie dado de alta en este aparato',
  'field.who.add':
    'Responder, firmar y decidir piden su propio PIN en este aparato. Fijarlo necesita la red una vez.',
  'field.who.setUp': 'Darme de alta en este teléfono',
  'field.who.other': 'Soy otra persona',
  'field.who.leave': 'Pasar el teléfono a otra persona',
  'field.pin.yours': 'Su PIN',
  'field.pin.open': 'Abrir',
  'field.pin.go': 'Seguir',
  'field.pin.idle': 'Nadie tocó este teléfono en 10 minutos. ¿Sigue siendo usted?',
  'field.pin.wrong': 'El PIN no es correcto. Pruebe otra vez.',
  'field.pin.wait': 'El PIN no es correcto. Pruebe otra vez en {seconds} s.',
  'field.part.electrician': 'electricista',
  'field.part.foreman': 'encargado',
} as const;

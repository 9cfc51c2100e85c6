export const person = {
  'field.who.sheet': 'Who is here?',
  'field.who.title': 'Who are you?',
  'field.who.nobody': 'Nobody is set up on this device yet',
  'field.who.add':
    'Answering, signing and deciding need your own PIN on this device. Setting it needs the network once.',
  'field.who.setUp': 'Set up this phone for me',
  'field.who.other': 'I am somebody else',
  'field.who.leave': 'Hand the phone over',
  'field.pin.yours': 'Your PIN',
  'field.pin.open': 'Open',
  'field.pin.go': 'Go on',
  'field.pin.idle': 'Nobody touched this phone for 10 minutes. Is it still you?',
  'field.pin.wrong': 'That PIN is wrong. Try again.',
  'field.pin.wait': 'That PIN is wrong. Try again in {seconds} s.',
  'field.part.electrician': 'electrician',
  'field.part.foreman': 'foreman',
} as const;

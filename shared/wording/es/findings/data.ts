export const data = {
  'finding.data.duplicate-address.title': 'Dirección repetida',
  'finding.data.duplicate-address': 'La dirección {value} figura en más de una fila: {points}.',
  'finding.data.duplicate-terminal.title': 'Borne repetido',
  'finding.data.duplicate-terminal': 'Los puntos {points} están todos en el borne {value}.',
  'finding.data.duplicate-wire.title': 'Número de hilo repetido',
  'finding.data.duplicate-wire': 'Los puntos {points} tienen todos el número de hilo {value}.',
  'finding.data.unused-terminal.title': 'Borne que no figura en la lista',
  'finding.data.unused-terminal':
    'Ninguna fila nombra estos bornes de {module}: {terminals}. ¿Hay algo en ellos?',
  'finding.data.spare-connected.title': 'Punto de reserva con cableado',
  'finding.data.spare-connected': 'El borne {terminal} figura como reserva, pero tiene algo conectado.',
} as const;

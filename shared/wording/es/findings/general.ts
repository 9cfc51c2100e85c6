export const general = {
  'finding.lacks': 'Nadie lo puede decir: falta {field}.',
  'finding.data.missing': 'Falta {field}. Estas comprobaciones lo esperan: {rules}.',
  'finding.data.missing.title': 'Falta un dato',
  'finding.pole.positive': 'positivo',
  'finding.pole.negative': '0 V',
  'finding.pole.line': 'fase',
  'finding.pole.neutral': 'neutro',
  'finding.current.ac': 'corriente alterna',
  'finding.current.dc': 'corriente continua',
  'finding.remedy.bleeder': 'Monte {ohm} ohm, {W} W, en paralelo con la entrada (de su borne a su común).',
  'finding.remedy.bleeder.heat':
    'Una resistencia de {ohm} ohm en paralelo con la entrada se calentaría demasiado. Use otro sensor u otra entrada.',
  'finding.remedy.bleeder.sensor':
    'El sensor no soporta una resistencia de {ohm} ohm en paralelo con la entrada. Use otro sensor u otra entrada.',
  'finding.remedy.bleeder.on':
    'Con {ohm} ohm en paralelo, la entrada dejaría de leer activa. Use otro sensor u otra entrada.',
  'finding.remedy.other-sensor': 'Use otro sensor u otra entrada.',
  'finding.remedy.on':
    'Mantenga la alimentación en {V} V o más, o use un sensor o un cable en el que caigan menos voltios.',
} as const;

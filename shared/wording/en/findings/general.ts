export const general = {
  'finding.lacks': 'Nobody can say: {field} is not stated.',
  'finding.data.missing': '{field} is not stated. These checks wait for it: {rules}.',
  'finding.data.missing.title': 'Datum missing',
  'finding.pole.positive': 'plus',
  'finding.pole.negative': '0 V',
  'finding.pole.line': 'line',
  'finding.pole.neutral': 'neutral',
  'finding.current.ac': 'AC',
  'finding.current.dc': 'DC',
  'finding.remedy.bleeder': 'Fit {ohm} ohm, {W} W, across the input (from its terminal to its common).',
  'finding.remedy.bleeder.heat':
    'A resistor of {ohm} ohm across the input would get too hot. Use another sensor or input.',
  'finding.remedy.bleeder.sensor':
    'The sensor cannot carry a resistor of {ohm} ohm across the input. Use another sensor or input.',
  'finding.remedy.bleeder.on':
    'With {ohm} ohm across the input it would no longer read on. Use another sensor or input.',
  'finding.remedy.other-sensor': 'Use another sensor or another input.',
  'finding.remedy.on': 'Keep the supply at {V} V or more, or use a sensor or cable that keeps fewer volts.',
} as const;

export const analogues = {
  'finding.analogue.compliance.title': 'Poca tensión en el lazo',
  'finding.analogue.compliance.loop': 'A 20 mA al lazo le faltan {lackV} V.',
  'finding.analogue.compliance.output-current':
    'La carga y su cable tienen {ohm} ohm. La salida admite {limitOhm} ohm como máximo.',
  'finding.analogue.compliance.output-volts':
    'La carga tiene {ohm} ohm. La salida necesita {limitOhm} ohm o más.',
  'remedy.analogue.compliance.loop':
    'Consiga {lackV} V: más tensión, un transmisor que pida menos o un cable más grueso.',
  'remedy.analogue.compliance.output-current':
    'Use una carga y un cable por debajo de {limitOhm} ohm, no {ohm}.',
  'remedy.analogue.compliance.output-volts': 'Use una carga de {limitOhm} ohm o más, no {ohm}.',

  'finding.analogue.power-twice.title': 'Lazo alimentado por los dos lados',
  'finding.analogue.power-twice.four-wire':
    '{device} alimenta el lazo por sí mismo y el módulo también lo alimenta.',
  'finding.analogue.power-twice.supply':
    '{device} recibe el positivo de una alimentación y el módulo también lo alimenta.',
  'remedy.analogue.power-twice': 'Use una entrada que no alimente el lazo, o quite el otro positivo.',

  'finding.analogue.power-none.title': 'Lazo sin alimentación',
  'finding.analogue.power-none.two-wire': 'Nada alimenta el lazo de {device}.',
  'remedy.analogue.power-none': 'Use una entrada que alimente el lazo, o lleve el positivo al transmisor.',

  'finding.analogue.lead-count.title': 'Hilos de la RTD',
  'finding.analogue.lead-count.few': '{device} tiene {wires} hilos. La entrada necesita {leads}.',
  'finding.analogue.lead-count.other': 'La entrada mide una RTD y {device} no lo es.',
  'remedy.analogue.lead-count': 'Use una RTD con los hilos que pide la entrada, o ajuste la entrada.',

  'finding.analogue.cable.title': 'Cable de una señal analógica',
  'finding.analogue.cable.other': 'La entrada mide un termopar y {device} no lo es.',
  'finding.analogue.cable.input-type':
    'El termopar es de tipo {type}. La entrada está ajustada para {inputType}.',
  'finding.analogue.cable.cable-type':
    'El termopar es de tipo {type}. El cable es "{cableType}" y falsea la medida.',
  'finding.analogue.cable.long': '0–10 V en {m} m sin pantalla. El límite habitual es {limitM} m.',
  'remedy.analogue.cable.other': 'Conecte {device} a una entrada de su clase.',
  'remedy.analogue.cable.input-type': 'Ajuste la entrada para {type}, no {inputType}.',
  'remedy.analogue.cable.cable-type': 'Use cable para tipo {type} hasta la entrada, no {cableType}.',
  'remedy.analogue.cable.long':
    'Para {m} m use un cable apantallado, o una señal de 4–20 mA (límite {limitM} m).',

  'finding.analogue.common-shared.title': 'Común compartido',
  'finding.analogue.common-shared':
    '{device} tiene su propia fuente y las entradas de {group} no están aisladas entre sí.',
  'remedy.analogue.common-shared': 'Use entradas aisladas, o averigüe si los 0 V están unidos a propósito.',
} as const;

export const analogues = {
  'finding.analogue.compliance.title': 'Too little voltage in the loop',
  'finding.analogue.compliance.loop': 'At 20 mA the loop lacks {lackV} V.',
  'finding.analogue.compliance.output-current':
    'The load and its cable have {ohm} ohm. The output drives {limitOhm} ohm at most.',
  'finding.analogue.compliance.output-volts':
    'The load has {ohm} ohm. The output needs {limitOhm} ohm or more.',
  'remedy.analogue.compliance.loop':
    'Find {lackV} V: a higher supply, a transmitter that needs less, a thicker cable.',
  'remedy.analogue.compliance.output-current': 'Use a load and cable under {limitOhm} ohm, not {ohm}.',
  'remedy.analogue.compliance.output-volts': 'Use a load of {limitOhm} ohm or more, not {ohm}.',

  'finding.analogue.power-twice.title': 'Loop powered from both sides',
  'finding.analogue.power-twice.four-wire': '{device} drives the loop itself, and the module powers it too.',
  'finding.analogue.power-twice.supply': '{device} gets plus from a supply, and the module powers it too.',
  'remedy.analogue.power-twice': 'Use an input that does not power the loop, or take the other plus away.',

  'finding.analogue.power-none.title': 'Loop without power',
  'finding.analogue.power-none.two-wire': 'Nothing powers the loop of {device}.',
  'remedy.analogue.power-none': 'Use an input that powers the loop, or bring plus to the transmitter.',

  'finding.analogue.lead-count.title': 'Leads of the RTD',
  'finding.analogue.lead-count.few': '{device} has {wires} wires. The input needs {leads}.',
  'finding.analogue.lead-count.other': 'The input measures an RTD and {device} is none.',
  'remedy.analogue.lead-count': 'Use an RTD with the wires that the input needs, or set the input for it.',

  'finding.analogue.cable.title': 'Cable of an analogue signal',
  'finding.analogue.cable.other': 'The input measures a thermocouple and {device} is none.',
  'finding.analogue.cable.input-type': 'The thermocouple is type {type}. The input is set for {inputType}.',
  'finding.analogue.cable.cable-type':
    'The thermocouple is type {type}. The cable is "{cableType}" and falsifies it.',
  'finding.analogue.cable.long': '0–10 V over {m} m without a screen. {limitM} m are the usual limit.',
  'remedy.analogue.cable.other': 'Connect {device} to an input of its own kind.',
  'remedy.analogue.cable.input-type': 'Set the input for {type}, not {inputType}.',
  'remedy.analogue.cable.cable-type': 'Use cable for type {type} up to the input, not {cableType}.',
  'remedy.analogue.cable.long': 'For {m} m use a screened cable, or a 4–20 mA signal (limit {limitM} m).',

  'finding.analogue.common-shared.title': 'Common shared',
  'finding.analogue.common-shared':
    '{device} has a source of its own, and the inputs of {group} are not isolated from each other.',
  'remedy.analogue.common-shared': 'Use isolated inputs, or find out whether the 0 V are joined on purpose.',
} as const;

export const inputs = {
  'finding.input.npn-on-sinking.title': 'NPN sensor on a common at 0 V',
  'finding.input.npn-on-sinking':
    '{device} is NPN: it switches to 0 V. Common {common} is at 0 V too, so no current can flow.',
  'finding.input.npn-on-sinking.remedy':
    'Use a PNP sensor for {device}, or a group whose common is on plus, not {group}.',
  'finding.input.pnp-on-sourcing.title': 'PNP sensor on a common at plus',
  'finding.input.pnp-on-sourcing':
    '{device} is PNP: it switches to plus. Common {common} is on plus too, so no current can flow.',
  'finding.input.pnp-on-sourcing.remedy':
    'Use an NPN sensor for {device}, or a group whose common is at 0 V, not {group}.',
  'finding.input.mixed-on-common.title': 'NPN and PNP sensors on one common',
  'finding.input.mixed-on-common':
    'Common {common} has NPN sensors ({npn}) and PNP sensors ({pnp}). One kind cannot work.',
  'finding.input.mixed-on-common.remedy': 'Put each kind on a common of its own.',
  'finding.input.led-reversed.title': 'Input wired the wrong way round',
  'finding.input.led-reversed':
    'This input conducts one way only. With common {common} at {pole} it stays off.',
  'finding.input.led-reversed.breaks':
    'This input conducts one way only. With common {common} at {pole} it is fed backwards and breaks.',
  'finding.input.led-reversed.remedy': 'Put the common of group {group} on the other pole.',
  'finding.input.namur.title': 'NAMUR sensor on a plain input',
  'finding.input.namur': '{device} is a NAMUR sensor. A plain input cannot read it.',
  'finding.input.namur.remedy': 'Put a NAMUR switching amplifier between, or use another sensor.',
  'finding.input.dc-sensor-on-ac.title': 'DC sensor on AC',
  'finding.input.dc-sensor-on-ac': '{device} is made for DC, but {supply} gives AC.',
  'finding.input.dc-sensor-on-ac.remedy': 'Use an AC sensor, or a DC supply and input.',
  'finding.input.ac-sensor-on-dc.title': 'AC sensor on DC',
  'finding.input.ac-sensor-on-dc': '{device} is made for AC, but {supply} gives DC.',
  'finding.input.ac-sensor-on-dc.remedy': 'Use a DC sensor, or an AC supply and input.',
  'finding.input.never-on.title': 'Input never reads on',
  'finding.input.never-on':
    'With its device switched, terminal {terminal} gets {V} V at worst. The input stays off.',
  'finding.input.never-off.title': 'Input never reads off',
  'finding.input.never-off.open':
    'With its device off, terminal {terminal} still has {V} V. The input stays on.',
  'finding.input.undefined.title': 'Input between on and off',
  'finding.input.undefined':
    'With its device switched, terminal {terminal} gets {V} V at worst. That is neither on nor off.',
  'finding.input.undefined.open':
    'With its device off, terminal {terminal} still has {V} V. That is neither on nor off.',
  'finding.input.overcurrent.title': 'Too much current',
  'finding.input.overcurrent': 'The input carries {mA} mA at the highest supply. It stands {maxmA} mA.',
  'finding.input.overcurrent.sensor':
    'The sensor must carry {mA} mA at the highest supply. It stands {maxmA} mA.',
  'finding.input.overcurrent.remedy': 'Add {ohm} ohm or more in series with the input.',
  'finding.input.resistor-hot.title': 'Resistor too hot',
  'finding.input.resistor-hot.series':
    'The series resistor turns {heat} W into heat. More than half of its {W} W is too much.',
  'finding.input.resistor-hot.bleeder':
    'The resistor across the input turns {heat} W into heat. More than half of its {W} W is too much.',
  'finding.input.resistor-hot.remedy': 'Fit a resistor of {W} W.',
  'finding.input.leakage.title': 'Leakage keeps the input on',
  'finding.input.leakage':
    'The sensor leaks {mA} mA while off. Terminal {terminal} then has {V} V and does not read off.',
  'finding.input.leakage.unsure':
    'The sensor leaks {mA} mA while off. Whether the input reads off hangs on {field}, which is not stated.',
  'finding.input.cable-capacitance.title': 'Long AC cable keeps the input on',
  'finding.input.cable-capacitance':
    'With the contact open, {m} m of cable put {V} V on terminal {terminal}. It does not read off.',
  'finding.input.min-load.title': 'Too little current for the sensor',
  'finding.input.min-load': '{device} gets {mA} mA while on. It needs {minmA} mA to stay on.',
  'finding.input.two-wire-in-series.title': 'Two-wire sensors in series',
  'finding.input.two-wire-in-series':
    '{count} two-wire sensors in series leave {V} V for the input. It does not read on.',
  'finding.input.two-wire-in-series.remedy':
    'Give each sensor an input of its own, or use three-wire sensors.',
  'finding.input.not-saturated.title': 'Optocoupler does not switch through',
  'finding.input.not-saturated':
    'The aged optocoupler carries {has} mA at the lowest supply. It must carry {needs} mA.',
  'finding.input.not-saturated.remedy':
    'Give the LED {mA} mA or more: a higher supply or a smaller series resistor.',
  'finding.input.earth-fault-on.title': 'Earth fault reads as on',
  'finding.input.earth-fault-on': 'One earth fault on wire {wire} reads as on, since {supply} is earthed.',
} as const;

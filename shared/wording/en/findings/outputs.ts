export const outputs = {
  'finding.output.triac-on-dc.title': 'Triac output on DC',
  'finding.output.triac-on-dc':
    '{module} switches with triacs and {supply} is DC. Once on, the output cannot turn off.',
  'remedy.output.triac-on-dc': 'Use a relay or a transistor output, or feed the group with AC.',

  'finding.output.switches-neutral.title': 'Output in the neutral',
  'finding.output.switches-neutral':
    'Terminal {terminal} switches the neutral of {supply}. Its load stays live when it is off.',
  'remedy.output.switches-neutral': 'Wire the common of {group} to the line and the load to the neutral.',

  'finding.output.leakage-holds.title': 'Leakage holds the load on',
  'finding.output.leakage-holds.moves':
    'Off, {leakmA} mA still leave {offV} V at {load}. It lets go below {limitV} V, so it can stay on or move.',
  'finding.output.leakage-holds.stays':
    'Off, {leakmA} mA still leave {offV} V at {load}. It goes out below {limitV} V, so it can stay on.',
  'remedy.output.leakage-holds': 'Fit {ohm} ohm, {W} W across the load. Never across the output.',
  'remedy.output.leakage-holds.relay':
    'Use a relay output, or put a small relay between. A resistor would run too hot.',

  'finding.output.ssr-load.title': 'Load side of a solid-state relay',
  'finding.output.ssr-load.ac-on-dc':
    'Relay {relay} is made for AC and {supply} is DC. Once on, it cannot turn off.',
  'finding.output.ssr-load.dc-on-ac': 'Relay {relay} is made for DC and {supply} is AC.',
  'finding.output.ssr-load.volts': '{supply} reaches {V} V. Relay {relay} takes {ratedV} V.',
  'finding.output.ssr-load.amps': 'The load draws {A} A. Relay {relay} carries {ratedA} A.',
  'finding.output.ssr-load.reversed': 'The load side of relay {relay} is drawn with plus on minus.',
  'remedy.output.ssr-load.ac-on-dc': 'Use a relay with a DC output.',
  'remedy.output.ssr-load.dc-on-ac': 'Use a relay with an AC output.',
  'remedy.output.ssr-load.volts': 'Use a relay for more volts.',
  'remedy.output.ssr-load.amps': 'Use a relay for more amps.',
  'remedy.output.ssr-load.reversed': 'Swap the two wires of the load side.',

  'finding.output.phase-mixed.title': 'Phases mixed on one module',
  'finding.output.phase-mixed':
    'On {module}, {V} V can stand between the commons {first} and {second}. The module parts {insulationV} V.',
  'remedy.output.phase-mixed':
    'Feed both from one phase, or use a module that parts {V} V, or one module each.',

  'finding.output.transistor-on-ac.title': 'Transistor output on AC',
  'finding.output.transistor-on-ac': '{module} switches with transistors and {supply} is AC. It breaks down.',
  'remedy.output.transistor-on-ac': 'Use a relay or a triac output, or feed the group with DC.',

  'finding.output.polarity.title': 'Plus and minus swapped',
  'finding.output.polarity.common':
    'The outputs of {what} switch the other pole: common {common} stands on the wrong pole of {supply}.',
  'finding.output.polarity.load': 'Load {what} at {terminal} is drawn with plus on minus.',
  'finding.output.polarity.pole':
    'The load of {what} goes back to the pole that the output itself switches. It gets no voltage.',
  'remedy.output.polarity.common':
    'Move the common to the other pole: sourcing outputs to plus, sinking ones to 0 V.',
  'remedy.output.polarity.load': 'Swap the two wires of the load.',
  'remedy.output.polarity.pole': 'Wire the far end of the load to the other pole.',

  'finding.output.earth-fault-starts.title': 'One earth fault turns it on',
  'finding.output.earth-fault-starts.moves':
    'The output switches the 0 V of {supply}, which is earthed. An earth fault on wire {wire} starts the load.',
  'finding.output.earth-fault-starts.stays':
    'The output switches the 0 V of {supply}, which is earthed. An earth fault on wire {wire} turns the load on.',
  'remedy.output.earth-fault-starts': 'Test the wire to earth. Better: let the output switch the plus.',

  'finding.output.point-current.title': 'Too much current for the output',
  'finding.output.point-current': 'The loads draw {A} A. The output carries {limitA} A.',
  'remedy.output.point-current': 'Put a relay between, or use an output for {A} A.',

  'finding.output.group-current.title': 'Too much current for the common',
  'finding.output.group-current':
    'All on, the {points} points of the group draw {A} A. The common carries {limitA} A.',
  'remedy.output.group-current': 'Move loads of {overA} A to another common.',

  'finding.output.inrush.title': 'Inrush too high',
  'finding.output.inrush.amps': 'Switching on draws {A} A. The output takes {limitA} A.',
  'finding.output.inrush.time':
    'Switching on draws {A} A for {ms} ms. The output takes {limitA} A for {limitMs} ms.',
  'remedy.output.inrush': 'Put a relay between that takes {A} A, or use an output that does.',

  'finding.output.contact-dc.title': 'Contact too weak for the DC coil',
  'finding.output.contact-dc': 'The coil draws {A} A at {V} V DC. The contact breaks {limitA} A.',
  'remedy.output.contact-dc': 'Use a contact or a transistor output for {A} A at {V} V DC.',
  'finding.output.contact-ac.title': 'Contact too weak for the AC coil',
  'finding.output.contact-ac':
    'At {V} V AC the coil draws {makesA} A, then {A} A. The contact makes {makeLimitA} A and breaks {limitA} A.',
  'remedy.output.contact-ac': 'Put a relay between, or use a contact for {A} A at {V} V AC.',

  'finding.output.voltage-window.title': 'Supply outside what the output or load takes',
  'finding.output.voltage-window.high': '{supply} reaches {V} V. The outputs of {module} take {limitV} V.',
  'finding.output.voltage-window.low':
    '{supply} falls to {V} V. The outputs of {module} need {limitV} V to switch fully.',
  'finding.output.voltage-window.load-high': '{supply} reaches {V} V. Load {load} takes {limitV} V.',
  'finding.output.voltage-window.load-kind':
    'Load {load} is made for the other kind of current than {supply} ({V} V, limit {limitV} V).',
  'remedy.output.voltage-window': 'Use a module for this supply, or a supply for this module.',
  'remedy.output.voltage-window.load': 'Use a load for this supply.',

  'finding.output.no-suppression.title': 'Coil without a suppressor',
  'finding.output.no-suppression.dc': 'Nothing takes the spike of DC coil {load}.',
  'finding.output.no-suppression.ac': 'Nothing takes the spike of AC coil {load}.',
  'remedy.output.no-suppression.dc':
    'Fit a diode for {V} V and {A} A across the coil, cathode to plus. It slows the release. Where that matters: a TVS for {standOffV} V.',
  'remedy.output.no-suppression.ac':
    'Fit {lowOhm} to {highOhm} ohm with {lowUF} to {highUF} µF across the coil, or a varistor for {movV} V AC.',

  'finding.output.wrong-suppression.title': 'Wrong suppressor',
  'finding.output.wrong-suppression.diode-on-ac':
    'A diode on {V} V AC is a short every other half wave, at {terminal}.',
  'finding.output.wrong-suppression.diode-at-contact':
    'A diode across the contact at {terminal} stops no spike ({V} V DC).',
  'finding.output.wrong-suppression.diode-volts':
    'The diode at {terminal} blocks {value} V. It needs {low} V at least, better {wanted} V.',
  'finding.output.wrong-suppression.diode-amps':
    'The diode at {terminal} carries {value} A. The coil puts {low} A through it.',
  'finding.output.wrong-suppression.stand-off':
    'The suppressor at {terminal} starts at {value} V. The supply reaches {low} V.',
  'finding.output.wrong-suppression.varistor':
    'The varistor at {terminal} is for {value} V. It needs {low} V at least.',
  'finding.output.wrong-suppression.rc-volts':
    'The capacitor at {terminal} is for {value} V AC. The supply reaches {low} V.',
  'finding.output.wrong-suppression.rc-ohm':
    'The RC at {terminal} has {value} ohm. It should have {low} to {high} ohm.',
  'finding.output.wrong-suppression.rc-farad':
    'The RC at {terminal} has {value} µF. It should have {low} to {high} µF.',
  'remedy.output.wrong-suppression.diode-on-ac': 'Fit an RC or a varistor for {V} V AC instead.',
  'remedy.output.wrong-suppression.diode-at-contact': 'Fit the diode across the coil ({V} V DC).',
  'remedy.output.wrong-suppression.diode-volts':
    'Fit a diode for {wanted} V, {low} V at least, not {value} V.',
  'remedy.output.wrong-suppression.diode-amps': 'Fit a diode for {low} A, not {value} A.',
  'remedy.output.wrong-suppression.stand-off': 'Fit one with a stand-off of {low} V, not {value} V.',
  'remedy.output.wrong-suppression.varistor': 'Fit a varistor for {low} V AC, not {value} V.',
  'remedy.output.wrong-suppression.rc-volts': 'Fit a capacitor for {low} V AC, not {value} V.',
  'remedy.output.wrong-suppression.rc-ohm': 'Fit {low} to {high} ohm, not {value} ohm.',
  'remedy.output.wrong-suppression.rc-farad': 'Fit {low} to {high} µF, not {value} µF.',

  'finding.output.suppressor-reversed.title': 'Suppressor the wrong way round',
  'finding.output.suppressor-reversed':
    'The suppressor at {terminal} is drawn the wrong way round. It is a short when the output turns on.',
  'remedy.output.suppressor-reversed': 'Turn it: cathode (the band) to plus.',

  'finding.output.min-load.title': 'Load too small',
  'finding.output.min-load': 'The load draws {mA} mA. The output needs {leastmA} mA.',
  'remedy.output.min-load': 'Fit {ohm} ohm, {W} W across the load.',
  'remedy.output.min-load.relay': 'Use an output for small loads. A resistor would run too hot.',

  'finding.output.load-underfed.title': 'Too little voltage at the load',
  'finding.output.load-underfed': '{V} V are left at {load}. It pulls in from {needsV} V.',
  'remedy.output.load-underfed':
    '{lackV} V are lacking. Use a thicker or shorter cable, or a supply that holds its volts.',

  'finding.output.ssr-control.title': 'Control side of a solid-state relay',
  'finding.output.ssr-control.low': 'Relay {relay} gets {V} V. It needs {limitV} V to turn on.',
  'finding.output.ssr-control.high': 'Relay {relay} gets {V} V. It takes {limitV} V.',
  'finding.output.ssr-control.ac':
    'Relay {relay} has a DC control side and gets AC ({V} V, made for {limitV} V DC).',
  'remedy.output.ssr-control.low': 'Use a relay that turns on at fewer volts, or a thicker cable.',
  'remedy.output.ssr-control.high': 'Use a relay for this control voltage.',
  'remedy.output.ssr-control.ac': 'Use a relay with an AC control side.',

  'finding.output.ssr-heat.title': 'Solid-state relay without a heat sink',
  'finding.output.ssr-heat': 'Relay {relay} carries {A} A and no heat sink is stated.',
  'remedy.output.ssr-heat': 'Look for the heat sink, and state it in the panel file.',
} as const;

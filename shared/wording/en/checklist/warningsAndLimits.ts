/** What a checklist says, in English: the warnings (ANSI Z535 signal words: will, could) and the sums behind limits. */
export const warningsAndLimits = {
  'checklist.warning.live-until-proven':
    'This panel is live until you prove it dead. Touch it and it will kill you.',
  'checklist.warning.no-load-break':
    '{tag} cannot break a load. If current flows, the arc will kill or burn you.',
  'checklist.warning.stand-aside':
    'An arc could burn or kill you. Stand to the side and turn your face away.',
  'checklist.warning.tag-only': 'A tag does not hold {tag}. Someone could turn it on and kill you.',
  'checklist.warning.touch-nothing': 'Parts behind the door will kill you if you touch them. Touch none yet.',
  'checklist.warning.stays-live': 'This stays live at {V} V: {place}. Touch it and it will kill you.',
  'checklist.warning.stays-live-low': 'This stays live at {V} V: {place}. A short could burn you.',
  'checklist.warning.stored-energy': 'Stored energy could crush or kill: {what}. Stay out of its path.',
  'checklist.warning.stored-charge': '{supply} could still hold its charge and shock or kill you.',
  'checklist.warning.charged-bank':
    'A short on {supply} could burn you badly. Discharge it through a resistor.',
  'checklist.warning.back-feed': 'Power from elsewhere could come back to {terminal} and kill you.',
  'checklist.warning.try-start': 'If a lock is wrong the machine could start and kill. Stand clear.',
  'checklist.warning.diode-reversed': 'A diode turned round is a short. It burns the output.',
  'checklist.warning.insulation':
    'The test puts {V} V on the wire. It could shock and kill. Let no one touch it.',
  'checklist.warning.energised': 'The panel is live. Touch a bare part and it will kill you.',
  'checklist.warning.live-measuring': 'These terminals are live at {V} V. Touch one and it will kill you.',
  'checklist.warning.energy-returns': '{tag} lets the energy back in. What moves could crush or kill.',
  'checklist.warning.motion-returns': '{tag} feeds things that move. They could start and crush or kill.',
  'checklist.warning.movement': '{device} could move and crush or kill. Keep all hands out.',
  'checklist.warning.motion': 'What moves will crush or kill who stands in it. Get them out.',
  'checklist.why.lowest': 'A dead test counts up to {V} V: the tester must show less.',
  'checklist.why.no-load-break': '{tag} may open only at 0 A.',
  'checklist.why.about': 'From half to twice {V} V.',
  'checklist.why.stored-unknown': '{supply} counts as charged until it reads near 0 V.',
  'checklist.why.fuse': 'Fuse {fuse} is {A} A in the panel file.',
  'checklist.why.fuse-most': 'No more than {A} A.',
  'checklist.why.bleeder': '{ohm} ohm, 5 % up or down.',
  'checklist.why.loop': '2 × {m} m × {perKm} ohm/km = {ohm} ohm at 20 °C; 20 % or 0.5 ohm up or down.',
  'checklist.why.insulation': 'At {V} V at least {Mohm} Mohm.',
  'checklist.why.supply': '{supply}: {V} V, {minPct} % to +{maxPct} %.',
  'checklist.why.input-on': '{V} V × {factor} − {drop} V device − {cable} V cable.',
  'checklist.why.input-off': 'The input is off for sure up to {V} V.',
  'checklist.why.output-on': '{V} V × {factor} − {drop} V output − {cable} V cable.',
  'checklist.why.output-off': '{percent} % of {V} V: above that the load may hold.',
  'checklist.why.point-current': 'The output may carry {A} A.',
  'checklist.why.signal': 'The range of {signal}.',
} as const;

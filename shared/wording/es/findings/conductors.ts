export const conductors = {
  'finding.wire.colour.title': 'Color del conductor',
  'finding.wire.colour.protective':
    'El hilo {wire} en {terminal} es verde y amarillo y tiene tensión. Ese color es solo para el conductor de tierra.',
  'finding.wire.colour.cable':
    'El cable {wire} en {terminal} tiene pocos hilos: un conductor con tensión usaría el verde y amarillo.',
  'finding.wire.colour.other': 'El hilo {wire} es {colour}. {practice} pide {expected}.',
  'remedy.wire.colour.protective': 'Use otro hilo u otro cable.',
  'remedy.wire.colour.other': 'Cambie el hilo o márquelo donde se conecta.',

  'finding.wire.too-small.title': 'Conductor demasiado fino',
  'finding.wire.too-small': 'La carga toma {A} A. El conductor soporta {carriesA} A.',
  'remedy.wire.too-small': 'Use un conductor para {A} A.',

  'finding.fuse.too-big.title': 'Fusible demasiado grande',
  'finding.fuse.too-big.wire': 'El fusible {fuse} es de {A} A. El hilo que protege soporta {limitA} A.',
  'finding.fuse.too-big.output': 'El fusible {fuse} es de {A} A. La salida que protege soporta {limitA} A.',
  'finding.fuse.too-big.group': 'El fusible {fuse} es de {A} A. El común que protege soporta {limitA} A.',
  'remedy.fuse.too-big': 'Ponga {maxA} A o menos.',
  'remedy.fuse.too-big.none': 'Ningún fusible normalizado es tan pequeño: use un hilo más grueso.',

  'finding.fuse.missing.title': 'Falta un fusible',
  'finding.fuse.missing.semiconductor':
    'Nada se abre si la salida en {terminal} toca el otro polo de {supply}.',
  'finding.fuse.missing.other-supply':
    '{supply} también llega a {terminal} y nada en serie con ella se abre.',
  'finding.fuse.missing.relay-load':
    'Nada protege la carga en {supply} que conmuta el relé conectado a {terminal}.',
  'remedy.fuse.missing':
    'Ponga un fusible de {fitA} A en serie con el punto. Aun así puede no salvar un transistor.',
  'remedy.fuse.missing.any': 'Ponga un fusible en serie con el punto. Aun así puede no salvar un transistor.',

  'finding.fuse.too-small.title': 'Fusible demasiado pequeño',
  'finding.fuse.too-small.load':
    'El fusible {fuse} es de {A} A. Las cargas que siguen activas necesitan {needsA} A.',
  'finding.fuse.too-small.quick':
    'El fusible {fuse} es rápido, de {A} A. Al conectar se toman más de {needsA} A.',
  'finding.fuse.too-small.selectivity':
    'El fusible {fuse} es de {A} A. Se abre junto con el siguiente; debería ser de {needsA} A.',
  'remedy.fuse.too-small.load': 'Ponga {minA} A, si el hilo y la salida lo soportan.',
  'remedy.fuse.too-small.quick': 'Ponga un fusible lento de {minA} A.',
  'remedy.fuse.too-small.selectivity': 'Ponga {minA} A delante, si el hilo y el común lo soportan.',

  'finding.wire.drop.title': 'El cable pierde demasiada tensión',
  'finding.wire.drop': 'El cable de {m} m pierde {V} V a {A} A. Se permiten {limitV} V.',
  'remedy.wire.drop': 'Use un cable más grueso, o como máximo {m} m de este.',

  'finding.wire.size-terminal.title': 'El conductor no corresponde al borne',
  'finding.wire.size-terminal.thin':
    'El borne {terminal} sujeta de {minMm2} a {maxMm2} mm². El conductor tiene {mm2} mm² y puede soltarse.',
  'finding.wire.size-terminal.thick':
    'El borne {terminal} sujeta de {minMm2} a {maxMm2} mm². El conductor tiene {mm2} mm² y no entra.',
  'remedy.wire.size-terminal': 'Use un conductor que el borne sujete, o un borne intermedio.',

  'finding.wire.screen.title': 'Pantalla',
  'finding.wire.screen.none': 'La pantalla de {cable} no está a tierra en ningún extremo. No frena el ruido.',
  'finding.wire.screen.both':
    'La pantalla de {cable} está a tierra en ambos extremos. Por ella corren corrientes de tierra.',
  'remedy.wire.screen':
    'Conéctela a tierra en un extremo, por regla general en el cuadro. Aísle y pliegue el otro.',
} as const;

import type { Coral } from '../../types'

/** "fish only" asks for no coral at all. */
export const coralPhrases: readonly (readonly [string, Coral | 'none'])[] = (
  [
    [
      'soft',
      'soft, softie, softies, soft coral, zoa, zoas, zoanthid, zoanthids, mushroom, mushrooms, leather, leathers, leather coral, xenia, gsp, star polyps, ' +
        'palys, palythoa, kenya tree, soft corals, softy, ricordea, toadstool',
    ],
    [
      'lps',
      'lps, lps coral, large polyp, hammer, hammers, torch, torches, frogspawn, euphyllia, acan, acans, duncan, duncans, candy cane, candycane, brain coral, trachyphyllia, blastomussa, chalice, elegance, large polyp stony, favia, hammer coral, torch coral, goniopora',
    ],
    [
      'sps',
      'sps, sps coral, small polyp, acro, acros, acropora, montipora, monti, montis, birdsnest, bird nest, stylophora, stylo, pocillopora, seriatopora, digitata, small polyp stony, staghorn, millepora, acroporas',
    ],
    ['none', 'fish only, fowlr, no coral, no corals, without coral, without corals, fish - only, fish tank only'],
  ] as const
).flatMap(([coral, list]) => list.split(', ').map((phrase) => [phrase, coral] as const))

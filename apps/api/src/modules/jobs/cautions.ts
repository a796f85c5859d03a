interface Caution {
  level: 'WARNING' | 'CAUTION' | 'NOTICE';
  text: string;
}

const manualFirst = 'The maker’s manual and the local rules come first.';

/** The first that fits a step's name decides. Wording of our own; the words after it defer to manual, sheet and rules. */
const cautions: { fits: RegExp; caution: Caution }[] = [
  {
    fits: /\b(dye|dyeing|stain|glue|cement|solvent|lacquer|top ?coat|edge finish|edge paint|thinner)/i,
    caution: {
      level: 'WARNING',
      text: 'Air and gloves; no flame, no spark. Rags into the closed metal bin. The product’s safety data sheet and the local rules come first.',
    },
  },
  {
    fits: /\b(hot|heat|foil|brand)/i,
    caution: {
      level: 'CAUTION',
      text: `Hot metal: use the holder, and let it cool before you change it. ${manualFirst}`,
    },
  },
  {
    fits: /\b(stamp|strike|emboss|press|deboss)/i,
    caution: {
      level: 'WARNING',
      text: `Hands clear before every stroke; never reach under a raised beam. ${manualFirst}`,
    },
  },
  {
    fits: /\b(cut|click|punch|die)/i,
    caution: {
      level: 'WARNING',
      text: `Hands clear before every stroke. Carry the die by its back, edge away from you. ${manualFirst}`,
    },
  },
  {
    fits: /\b(skive|skiving|split|trim|bevel|pare|slice)/i,
    caution: {
      level: 'WARNING',
      text: `Open edge: cut away from your hand, cover the blade when you lay it down. ${manualFirst}`,
    },
  },
  {
    fits: /\b(rivet|snap|eyelet|grommet|hammer|set)/i,
    caution: {
      level: 'CAUTION',
      text: `Protect your eyes; use a soft mallet on setters, keep fingers off the anvil. ${manualFirst}`,
    },
  },
];

/** A short caution for a step, by what its name says is done; whatever is struck is under a press. */
export function cautionFor(step: { name: string; per: string }): Caution | null {
  const words = step.per === 'strike' ? `${step.name} strike` : step.name;
  return cautions.find(({ fits }) => fits.test(words))?.caution ?? null;
}

interface CautionText {
  title: string;
  text: string;
}

const byCriterion: Readonly<Record<string, CautionText>> = {
  'casing.lagging': {
    title: 'Old lagging may hold asbestos.',
    text: 'If nobody knows what it is, leave it as it lies, mark this item not examined and say why.',
  },
  'shell.joints': {
    title: 'Old silver solder may hold cadmium, and soft solder has no place in a pressure joint.',
    text: 'Do not heat or file a joint to find out.',
  },
  'firing.fuel': {
    title: 'Gas gathers low.',
    text: 'Try for leaks in the open or with the doors open, with no flame about, before anything is lit.',
  },
  'firing.draught': {
    title: 'Carbon monoxide cannot be smelt.',
    text: 'Fire out of doors or with the doors open, with the meter running. If it sounds, shut off and leave.',
  },
};

/** What to mind at an item before touching it. */
export const cautionFor = (criterionId: string): CautionText | undefined => byCriterion[criterionId];

/** What freight and duty can be shared out by, as cards to choose from. */
export const carriageBasisCards = [
  { value: 'value', label: 'By value', detail: 'what costs more bears more' },
  { value: 'area', label: 'By area', detail: 'the leather alone bears it' },
  { value: 'count', label: 'By count', detail: 'the hardware alone bears it, by the piece' },
];

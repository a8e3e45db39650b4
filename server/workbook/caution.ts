/** The caution of every result, in full words. */
export const caution =
  'Results are an aid for qualified engineers; the governing local code prevails; a licensed professional must review them before they are used for construction.';

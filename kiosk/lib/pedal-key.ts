/** What a foot pedal types when a pour is done (`KeyboardEvent.key`); no pad and no button listens to it. */
export const pedalKey = 'F9';

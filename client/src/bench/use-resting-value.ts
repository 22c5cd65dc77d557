import { useState } from 'react';

/** The newest value, but while a drag goes on the one from before it: for what is read out and need not follow each frame. */
export function useRestingValue<Value>(value: Value, isDragging: boolean): Value {
  const [held, setHeld] = useState(value);
  if (!isDragging && held !== value) setHeld(value);
  return isDragging ? held : value;
}

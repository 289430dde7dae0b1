import { useEffect, useState } from 'react';
import { TextInput } from './text-input';

export interface SearchBoxProps {
  label: string;
  value: string;
  onSearch: (text: string) => void;
  hint?: string;
  size?: 'office' | 'field';
}

/** Searches a moment after the last key; there is no button to press. */
export function SearchBox({ label, value, onSearch, hint, size = 'field' }: SearchBoxProps) {
  const [text, setText] = useState(value);
  const [seen, setSeen] = useState(value);
  // The address can change without typing: the back button, or a filter that is cleared.
  if (value !== seen) {
    setSeen(value);
    setText(value);
  }
  useEffect(() => {
    if (text === value) return undefined;
    const timer = setTimeout(() => onSearch(text.trim()), 250);
    return () => clearTimeout(timer);
  }, [text, value, onSearch]);
  return (
    <TextInput
      type="search"
      label={label}
      hint={hint}
      size={size}
      value={text}
      onChange={(event) => setText(event.target.value)}
      enterKeyHint="search"
    />
  );
}

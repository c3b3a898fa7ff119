import { Box, Input } from '@chakra-ui/react';
import { Search } from 'lucide-react';
import { useEffect, useState } from 'react';
import { useUrlState } from './use-url-state';

const PAUSE_MS = 250;

/** Searches while one types, with a short pause so that not every letter is asked for. */
export function SearchBox({ label, placeholder }: { label: string; placeholder: string }) {
  const [kept, keep] = useUrlState('search');
  const [text, setText] = useState(kept);
  useEffect(() => {
    if (text.trim() === kept) return;
    const timer = setTimeout(() => keep(text.trim()), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [text, kept, keep]);
  return (
    <Box position="relative" width="full" maxWidth="28rem" className="no-print">
      <Box
        position="absolute"
        insetStart="3"
        top="50%"
        transform="translateY(-50%)"
        color="fg.muted"
        zIndex="1"
      >
        <Search size={20} aria-hidden="true" />
      </Box>
      <Input
        type="search"
        ps="10"
        aria-label={label}
        placeholder={placeholder}
        value={text}
        onChange={(event) => setText(event.target.value)}
      />
    </Box>
  );
}

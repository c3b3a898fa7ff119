import { Box, chakra, Progress, Text } from '@chakra-ui/react';
import { FileUp } from 'lucide-react';
import { useState } from 'react';
import type { DragEvent } from 'react';

interface FileDropProps {
  label: string;
  /** Which files are taken and how large they may be. */
  help: string;
  /** Endings with the dot, as the browser's own choice takes them: '.gpx,.fit'. */
  accept: string;
  multiple?: boolean;
  onFiles: (files: File[]) => void;
  /** Share done, 0 to 1, while files are sent or read; null = at rest. */
  progress?: number | null;
  /** What is being done, beside the bar. */
  doing?: string;
}

const Zone = chakra('label', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'center',
    gap: 2,
    px: 4,
    py: 8,
    textAlign: 'center',
    color: 'fg.muted',
    bg: 'bg.panel',
    borderWidth: '2px',
    borderStyle: 'dashed',
    borderColor: 'border.control',
    borderRadius: 'l3',
    cursor: 'pointer',
    '&:hover, &[data-over=true]': { bg: 'steel.subtle', borderColor: 'steel.solid' },
    '&:has(:focus-visible)': { outline: '3px solid', outlineColor: 'steel.solid', outlineOffset: '2px' },
  },
});

/** A place to drop files or choose them, and how far they have come. */
export function FileDrop(props: FileDropProps) {
  const { label, help, accept, multiple = false, onFiles, progress = null, doing } = props;
  const [over, setOver] = useState(false);
  const busy = progress !== null;
  const take = (list: FileList | null) => {
    const files = [...(list ?? [])];
    if (!busy && files.length > 0) onFiles(multiple ? files : files.slice(0, 1));
  };
  const drag = (event: DragEvent, isOver: boolean) => {
    event.preventDefault();
    setOver(isOver && !busy);
  };
  const drop = (event: DragEvent) => {
    drag(event, false);
    take(event.dataTransfer.files);
  };
  return (
    <Box>
      <Zone
        data-over={over}
        onDragOver={(event) => drag(event, true)}
        onDragLeave={(event) => drag(event, false)}
        onDrop={drop}
      >
        <FileUp size={32} strokeWidth={1.5} aria-hidden="true" />
        <Text as="span" fontWeight="semibold" color="fg">
          {label}
        </Text>
        <span>{help}</span>
        <chakra.input
          type="file"
          srOnly
          accept={accept}
          multiple={multiple}
          disabled={busy}
          onChange={(event) => {
            take(event.target.files);
            event.target.value = '';
          }}
        />
      </Zone>
      {busy && (
        <Progress.Root value={Math.round(progress * 100)} mt="4" aria-label={doing ?? label}>
          <Progress.Track>
            <Progress.Range />
          </Progress.Track>
          <Text color="fg.muted" mt="1" role="status">
            {doing ?? 'Working'}: {Math.round(progress * 100)} %
          </Text>
        </Progress.Root>
      )}
    </Box>
  );
}

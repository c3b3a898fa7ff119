import type { SystemStyleObject } from '@chakra-ui/react';

/** Rows with hairlines; below 48 em each row a card with its headings beside the values. */
export const tableStyles: SystemStyleObject = {
  borderCollapse: 'collapse',
  width: 'full',
  fontVariantNumeric: 'lining-nums tabular-nums',
  '& th, & td': { px: 3, py: 3, verticalAlign: 'middle' },
  '& thead th': { color: 'fg.muted', textStyle: 'sm', fontWeight: 'semibold', borderBottomWidth: '1px' },
  '& tbody th': { textAlign: 'start', fontWeight: 'semibold' },
  '& tbody tr': { borderBottomWidth: '1px' },
  '& tbody tr:hover': { bg: 'bg.muted' },
  mdDown: {
    '&, & tbody, & tr, & th, & td': { display: 'block' },
    '& thead': { srOnly: true },
    '& tbody tr': { borderWidth: '1px', borderRadius: 'l3', bg: 'bg.panel', mb: 3, py: 2 },
    '& th, & td': { py: 1 },
    '& td': { display: 'flex', gap: 4, justifyContent: 'space-between', textAlign: 'end' },
    '& td::before': { content: 'attr(data-head)', color: 'fg.muted', textAlign: 'start' },
  },
};

import { HStack, Text } from '@chakra-ui/react';

/** One link of the chain, a roller filled and a roller open: the mark of the house. */
export function BrandMark({ size = 28 }: { size?: number }) {
  return (
    <svg width={size * 1.5} height={size} viewBox="0 0 48 32" aria-hidden="true" fill="none">
      <path
        d="M14 4a12 12 0 0 1 7 2.3q3 1.9 6 0A12 12 0 1 1 27 25.7q-3-1.9-6 0A12 12 0 1 1 14 4z"
        stroke="currentColor"
        strokeWidth="2.5"
      />
      <circle cx="14" cy="16" r="5.2" fill="currentColor" />
      <circle cx="34" cy="16" r="5.2" stroke="currentColor" strokeWidth="2.5" />
    </svg>
  );
}

export function Brand({ name = true }: { name?: boolean }) {
  return (
    <HStack gap="2.5" color="steel.fg">
      <BrandMark />
      {name && (
        <Text as="span" fontWeight="semibold" fontSize="xl" letterSpacing="-0.02em" color="fg">
          Halfpitch
        </Text>
      )}
    </HStack>
  );
}

import { Link } from '@chakra-ui/react';
import { Link as RouterLink } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';

export function NotFound() {
  return (
    <EmptyState title="There is no such page">
      The address may be mistyped, or what it showed was removed.{' '}
      <Link asChild>
        <RouterLink to="/">Go to the start page</RouterLink>
      </Link>
    </EmptyState>
  );
}

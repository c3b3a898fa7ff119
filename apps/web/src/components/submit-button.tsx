import { Button } from '@chakra-ui/react';
import type { ButtonProps } from '@chakra-ui/react';
import { useFormContext } from 'react-hook-form';

/** Sends the form around it; shows that it is being sent, and can't be pressed twice. */
export function SubmitButton(props: ButtonProps) {
  const { formState } = useFormContext();
  return <Button type="submit" loading={formState.isSubmitting} loadingText={props.children} {...props} />;
}

import { chakra, Stack } from '@chakra-ui/react';
import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import type { ReactNode } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import type { DefaultValues } from 'react-hook-form';
import type { z } from 'zod';
import { showProblems } from '../app/form-problems';
import { Notice } from './notice';

interface FormProps<I extends Record<string, unknown>, O> {
  /** The contract of what is sent; its messages stand beside the fields. */
  schema: z.ZodType<O, I>;
  defaultValues: DefaultValues<I>;
  /** Sends it; what the server refuses is shown beside the fields it names. */
  onSubmit: (values: O) => Promise<unknown>;
  children: ReactNode;
}

/** A form held against its contract before it is sent, and against the server's answer after. */
export function Form<I extends Record<string, unknown>, O>({
  schema,
  defaultValues,
  onSubmit,
  children,
}: FormProps<I, O>) {
  const form = useForm<I, unknown, O>({ resolver: zodResolver(schema), defaultValues });
  const [trouble, setTrouble] = useState<string | null>(null);
  const send = form.handleSubmit(async (values) => {
    setTrouble(null);
    try {
      await onSubmit(values);
    } catch (error) {
      const shown = [...form.control._names.mount];
      setTrouble(showProblems(error, shown, form.setError));
    }
  });
  return (
    <FormProvider {...form}>
      <chakra.form noValidate onSubmit={(event) => void send(event)} width="full">
        <Stack gap="5">
          {trouble && <Notice kind="trouble">{trouble}</Notice>}
          {children}
        </Stack>
      </chakra.form>
    </FormProvider>
  );
}

import { Button, Flex, Stack } from '@chakra-ui/react';
import { planInput } from '@halfpitch/contracts';
import type { Bike, Plan, PlanInput } from '@halfpitch/contracts';
import { useNavigate } from 'react-router-dom';
import { useFormat } from '../../app/use-format';
import { DateField } from '../../components/fields/date-field';
import { DistanceField } from '../../components/fields/distance-field';
import { TextField } from '../../components/fields/text-field';
import { Form } from '../../components/form';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { BikeChoice } from '../rides/bike-choice';

interface PlanFormProps {
  bikes: readonly Bike[];
  defaultValues: Partial<PlanInput>;
  save: (input: PlanInput) => Promise<Plan>;
}

/** What is planned, when and how far. */
export function PlanForm({ bikes, defaultValues, save }: PlanFormProps) {
  const { today } = useFormat();
  const navigate = useNavigate();
  const changed = useChanged();
  return (
    <Form
      schema={planInput}
      defaultValues={defaultValues}
      onSubmit={async (values) => {
        const plan = await save(values);
        changed(plan.outlook?.chainId ?? null);
        toastDone(`${plan.name} is planned.`);
        await navigate(`/bikes/${plan.bikeId}`, { replace: true });
      }}
    >
      <BikeChoice bikes={bikes} />
      <TextField name="name" label="What is planned" help="For example a training week, or a tour." />
      <DistanceField
        name="distanceM"
        label="Distance"
        help="Beside your usual riding: what you ride anyway is counted already."
      />
      <Stack direction={{ base: 'column', sm: 'row' }} gap="4">
        <DateField name="from" label="From" min={today} />
        <DateField name="to" label="To" min={today} />
      </Stack>
      <Flex gap="3">
        <SubmitButton>Save the plan</SubmitButton>
        <Button variant="outline" onClick={() => void navigate(-1)}>
          Back
        </Button>
      </Flex>
    </Form>
  );
}

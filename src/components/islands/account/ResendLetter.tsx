import { useMutation } from '@tanstack/react-query';
import { post } from '../../../client/api';
import { acceptedSchema } from '../../../schemas/account';
import { Button } from '../../ui/Button';
import { failureWords } from '../form/formErrors';

/** Sends the confirmation letter again, and says so. */
export function ResendLetter({ email }: { email: string }) {
  const again = useMutation({
    mutationFn: () => post('/api/account/resend-confirmation', { email }, acceptedSchema),
  });
  return (
    <>
      <Button small busy={again.isPending && 'Sending…'} onClick={() => again.mutate()}>
        Send the letter again
      </Button>
      <p role="status" className="self-center text-sm">
        {again.isSuccess && 'Sent again. It can take a few minutes.'}
        {again.isError && failureWords(again.error)}
      </p>
    </>
  );
}

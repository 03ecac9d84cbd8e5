import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';

interface FormFrameProps {
  readonly action: (form: FormData) => void;
  readonly pending: boolean;
  readonly problem?: string | undefined;
  readonly submit: string;
  readonly children: ReactNode;
}

/** Fields under one another, a message over the button where the whole form has one. */
export function FormFrame({ action, pending, problem, submit, children }: FormFrameProps) {
  return (
    <form action={action} noValidate className="grid max-w-md gap-5">
      {children}
      {problem && (
        <Notice tone="danger" live>
          {problem}
        </Notice>
      )}
      <div>
        <Button type="submit" disabled={pending}>
          {submit}
        </Button>
      </div>
    </form>
  );
}

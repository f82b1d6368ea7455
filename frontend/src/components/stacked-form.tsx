import { chakra } from '@chakra-ui/react';
import { Form } from 'formik';
import type { ReactNode } from 'react';

/** A Formik form of one column, its entries below each other; the messages are ours and not the browser's. */
export function StackedForm({ children }: { children: ReactNode }) {
  return (
    <chakra.div maxWidth="form" css={{ '& > form': { display: 'grid', gap: 4, justifyItems: 'stretch' } }}>
      <Form noValidate>{children}</Form>
    </chakra.div>
  );
}

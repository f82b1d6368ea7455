import { Dialog, Portal, chakra } from '@chakra-ui/react';
import { Form, Formik } from 'formik';
import type { ReactNode } from 'react';
import { type ObjectShape, object } from 'yup';
import { problemOf } from '../api/problem';
import { Button } from './button';
import { FormField } from './form-field';
import { FormRefusal } from './form-refusal';
import { reasonRule } from './reason-rule';

export interface ConfirmWithReasonProps<Values extends Record<string, string>> {
  title: string;
  description: ReactNode;
  /** The words on the button that does it. */
  act: string;
  /** What else is asked beside the reason, with its fields as children. */
  initialValues: Values;
  rules?: ObjectShape;
  children?: ReactNode;
  error: unknown;
  onConfirm: (values: Values & { reason: string }) => Promise<unknown>;
  onClose: () => void;
}

/** A change of state that is asked about once more, and never made without a reason. */
export function ConfirmWithReason<Values extends Record<string, string>>(
  props: ConfirmWithReasonProps<Values>,
) {
  const { title, description, act, initialValues, rules = {}, children, error, onConfirm, onClose } = props;
  return (
    <Dialog.Root open closeOnInteractOutside={false} onOpenChange={({ open }) => !open && onClose()}>
      <Portal>
        <Dialog.Backdrop />
        <Dialog.Positioner>
          <Dialog.Content>
            <Dialog.Title>{title}</Dialog.Title>
            <Dialog.Description>{description}</Dialog.Description>
            <Dialog.Body>
              <Formik
                // A message that appears while one presses the button would move the button from under the press.
                validateOnBlur={false}
                initialValues={{ ...initialValues, reason: '' }}
                validationSchema={object({ ...rules, reason: reasonRule })}
                onSubmit={(values) =>
                  onConfirm({ ...values, reason: values.reason.trim() }).then(onClose, () => undefined)
                }
              >
                {({ isSubmitting }) => (
                  <chakra.div css={{ '& > form': { display: 'grid', gap: 4 } }}>
                    <Form noValidate>
                      {error !== null && <FormRefusal error={error} />}
                      {children}
                      <FormField
                        name="reason"
                        label="Reason"
                        multiline
                        refusal={error === null ? undefined : problemOf(error).at('/reason')}
                      />
                      <Dialog.Footer>
                        <Button onClick={onClose}>Leave it as it is</Button>
                        <Button type="submit" variant="solid" disabled={isSubmitting}>
                          {act}
                        </Button>
                      </Dialog.Footer>
                    </Form>
                  </chakra.div>
                )}
              </Formik>
            </Dialog.Body>
          </Dialog.Content>
        </Dialog.Positioner>
      </Portal>
    </Dialog.Root>
  );
}

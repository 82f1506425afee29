'use client';

import { useEffect, type RefObject } from 'react';
import { draftKey, forgetFormDraft, keepFormDraft, takeFormDraft } from '@/lib/browser/form-draft';
import type { FormState } from './form-state';

/**
 * Lets nothing typed be lost to a session that has ended: what the form sends is kept until its answer
 * is here, and put back when somebody has signed in again and come back.
 * @returns what the form does when it is sent.
 */
export function useFormDraft(
  form: RefObject<HTMLFormElement | null>,
  name: string,
  state: FormState,
): () => void {
  useEffect(() => {
    const values = takeFormDraft(draftKey(name));
    for (const [field, value] of Object.entries(values ?? {})) {
      const control = form.current?.elements.namedItem(field);
      if (isTypedInto(control)) control.value = value;
    }
  }, [form, name]);
  useEffect(() => {
    if (state.outcome !== 'idle') forgetFormDraft(draftKey(name));
  }, [state, name]);
  return () => {
    if (form.current) keepFormDraft(draftKey(name), new FormData(form.current));
  };
}

function isTypedInto(
  control: Element | RadioNodeList | null | undefined,
): control is HTMLInputElement | HTMLSelectElement | HTMLTextAreaElement {
  return (
    (control instanceof HTMLInputElement && control.type !== 'file') ||
    control instanceof HTMLSelectElement ||
    control instanceof HTMLTextAreaElement
  );
}

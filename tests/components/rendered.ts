import { act, type ReactNode } from 'react';
import { createRoot, type Root } from 'react-dom/client';

declare global {
  var IS_REACT_ACT_ENVIRONMENT: boolean;
}
globalThis.IS_REACT_ACT_ENVIRONMENT = true;

/** A component on a page of its own, with the few gestures that tests need. */
export interface Rendered {
  container: HTMLElement;
  input(label: string): HTMLInputElement;
  type(label: string, text: string): Promise<void>;
  press(word: string): Promise<void>;
  close(): Promise<void>;
}

const settle = () => new Promise((resolve) => setTimeout(resolve, 0));

/** Runs a gesture and lets React and the form come to rest. */
export async function settled(gesture: () => void = () => undefined): Promise<void> {
  await act(async () => {
    gesture();
    await settle();
    await settle();
  });
}

/** Renders a component into the document of jsdom. */
export async function render(node: ReactNode): Promise<Rendered> {
  const container = document.createElement('div');
  document.body.append(container);
  let root: Root | undefined;
  await settled(() => {
    root = createRoot(container);
    root.render(node);
  });
  const input = (label: string) => {
    const found = [...container.querySelectorAll('label')].find((l) => l.textContent === label);
    const control = found && document.getElementById(found.htmlFor);
    if (!(control instanceof HTMLInputElement)) throw new Error(`No field "${label}".`);
    return control;
  };
  return {
    container,
    input,
    async type(label, text) {
      const control = input(label);
      await settled(() => {
        control.focus();
        const setText = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')!.set!;
        setText.call(control, text);
        control.dispatchEvent(new Event('input', { bubbles: true }));
      });
      await settled(() => control.blur());
    },
    async press(word) {
      const button = [...container.querySelectorAll('button')].find(
        (b) => b.textContent?.trim() === word || b.getAttribute('aria-label') === word,
      );
      if (!button) throw new Error(`No button "${word}".`);
      await settled(() => button.click());
    },
    async close() {
      await settled(() => root?.unmount());
      container.remove();
    },
  };
}

import type { ReactNode } from 'react';

export interface ChoiceOption {
  readonly value: string;
  readonly label: string;
  /** A second line. */
  readonly note?: string;
  /** A price or measure at the right, or under the label in a tall card. */
  readonly figure?: string;
  /** A word in a tag: "Recommended". */
  readonly tag?: string;
  /** More lines under the label. Text only: nothing that can be pressed. */
  readonly details?: ReactNode;
}

export interface UnsureOption {
  /** Stored when picked; "unsure" if not given. */
  readonly value?: string;
  readonly label: string;
  /** One calm line under the group once it is picked. */
  readonly note: string;
  /** A photo can answer it: shows a camera. */
  readonly photo?: string | boolean;
}

export interface ChoiceGroupProps {
  /** The group's id; the error summary sends focus into it. */
  readonly id: string;
  readonly label: string;
  /** The page's title asks it already: the label is only spoken. */
  readonly hideLabel?: boolean;
  readonly hint?: string;
  readonly choices: readonly ChoiceOption[];
  readonly unsure?: UnsureOption;
  readonly error?: string | null;
  readonly columns?: 1 | 2 | 3;
  readonly onBlur?: () => void;
}

export const UNSURE_VALUE = 'unsure';

/** Whether the labels are short enough for two cards side by side on a phone. `noteLength`: how long a second line may be. */
export const shortLabels = (choices: readonly ChoiceOption[], noteLength = 0): boolean =>
  choices.every((choice) => choice.label.length <= 13 && (choice.note?.length ?? 0) <= noteLength && !choice.details);

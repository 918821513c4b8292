/** The controls of the page. What draws them is one file, `toolkit.ts`: a successor replaces that file and nothing else. */
export { button, checkbox, registerControls } from './toolkit.ts';

export interface ButtonOptions {
  readonly label: string;
  /** What it does in full, where the label alone is too short. */
  readonly title?: string;
  readonly onPress: () => void;
}

export interface CheckboxOptions {
  readonly label: string;
  readonly checked: boolean;
  /** The id of the element that the box shows and hides. */
  readonly controls: string;
  readonly onChange: (checked: boolean) => void;
}

import { fireEvent, screen } from '@testing-library/react-native';
import { Text } from 'react-native';

import { Button } from '@/components/ui/Button';
import { Caution } from '@/components/ui/Caution';
import { Choice } from '@/components/ui/Choice';
import { Dialog } from '@/components/ui/Dialog';
import { InputWindow } from '@/components/ui/InputWindow';
import { StatusMark } from '@/components/ui/Marks';
import { Notice } from '@/components/ui/Notice';
import { TextField } from '@/components/ui/TextField';
import { TickProgress } from '@/components/ui/TickProgress';
import { TARGET } from '@/components/ui/tokens';

import { draw } from '../support/kit';

describe('A button', () => {
  it('is found by its label, is large enough for a finger and does what it says', () => {
    const press = jest.fn();
    draw(<Button label="Undo" onPress={press} />);
    const button = screen.getByRole('button', { name: 'Undo' });
    fireEvent.press(button);
    expect(press).toHaveBeenCalledTimes(1);
    expect(button).toHaveStyle({ minHeight: TARGET.finger, minWidth: TARGET.finger });
  });

  it('takes no second press while its work is under way', () => {
    const press = jest.fn();
    draw(<Button label="Freeze" busy onPress={press} />);
    const button = screen.getByRole('button', { name: 'Freeze' });
    fireEvent.press(button);
    expect(press).not.toHaveBeenCalled();
    expect(button).toBeDisabled();
    expect(button).toBeBusy();
  });
});

describe('An input window', () => {
  it('echoes how the entry was understood', () => {
    draw(<InputWindow label="Bulk capacitance" value="470u" onChangeText={jest.fn()} echo="470 µF" />);
    expect(screen.getByText(/= 470 µF/)).toBeOnTheScreen();
    expect(screen.getByLabelText('Bulk capacitance')).toHaveDisplayValue('470u');
  });

  it('puts the error in place of the echo and announces it', () => {
    draw(<InputWindow label="Contact resistance" value="8mm" onChangeText={jest.fn()} echo="8 mΩ" error="One prefix only, such as 8m" />);
    expect(screen.queryByText(/8 mΩ/)).toBeNull();
    expect(screen.getByRole('alert')).toHaveTextContent('One prefix only, such as 8m');
  });

  it('hands on what is typed as it is typed', () => {
    const change = jest.fn();
    draw(<InputWindow label="R25" value="" onChangeText={change} />);
    fireEvent.changeText(screen.getByLabelText('R25'), '4k7');
    expect(change).toHaveBeenCalledWith('4k7');
  });
});

describe('A text field', () => {
  it('shows the error rather than the hint', () => {
    draw(<TextField label="E-mail" value="" onChangeText={jest.fn()} hint="Of your firm" error="Write an address" />);
    expect(screen.queryByText('Of your firm')).toBeNull();
    expect(screen.getByRole('alert')).toHaveTextContent('Write an address');
  });
});

describe('A choice', () => {
  it('tells which option stands and passes on another', () => {
    const change = jest.fn();
    draw(<Choice label="Contact" value="works" onChange={change} options={[{ value: 'works', label: 'works' }, { value: 'welded', label: 'welded' }]} />);
    expect(screen.getByRole('radio', { name: 'works' })).toBeChecked();
    fireEvent.press(screen.getByRole('radio', { name: 'welded' }));
    expect(change).toHaveBeenCalledWith('welded');
  });
});

describe('A dialog', () => {
  it('is not there until it is opened', () => {
    draw(<Dialog title="Freeze" open={false} onClose={jest.fn()}><Text>Inputs are kept</Text></Dialog>);
    expect(screen.queryByText('Inputs are kept')).toBeNull();
  });

  it('has a heading, its content and its actions', () => {
    const keep = jest.fn();
    draw(<Dialog title="Freeze" open onClose={jest.fn()} actions={<Button label="Keep" onPress={keep} />}><Text>Inputs are kept</Text></Dialog>);
    expect(screen.getByRole('heading', { name: 'Freeze' })).toBeOnTheScreen();
    fireEvent.press(screen.getByRole('button', { name: 'Keep' }));
    expect(keep).toHaveBeenCalled();
  });
});

describe('What must be noticed', () => {
  it('names every status by a word of its own', () => {
    draw(<><StatusMark status="fail" /><StatusMark status="not-assessed" /><StatusMark status="caution" /><StatusMark status="pass" /></>);
    for (const word of ['Fail', 'Not assessed', 'Caution', 'Pass']) expect(screen.getByLabelText(word)).toBeOnTheScreen();
  });

  it('offers a way out of being offline', () => {
    const retry = jest.fn();
    draw(<Notice kind="offline" title="Not connected" action={{ label: 'Retry', onPress: retry }}>3 edits are kept.</Notice>);
    fireEvent.press(screen.getByRole('button', { name: 'Retry' }));
    expect(retry).toHaveBeenCalled();
  });

  it('says a caution with its title first', () => {
    draw(<Caution title="Stored charge">Bus holds 357 V.</Caution>);
    expect(screen.getByText(/^Stored charge\. Bus holds 357 V\.$/)).toBeOnTheScreen();
  });

  it('shows how far long work has come, and cancels it', () => {
    const cancel = jest.fn();
    draw(<TickProgress label="Computing corner 9 of 24" done={9} total={24} onCancel={cancel} />);
    expect(screen.getByRole('progressbar')).toHaveAccessibilityValue({ min: 0, max: 24, now: 9 });
    fireEvent.press(screen.getByRole('button', { name: 'Cancel' }));
    expect(cancel).toHaveBeenCalled();
  });
});

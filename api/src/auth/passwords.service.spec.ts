import { compare } from 'bcrypt';
import { passwordCost, Passwords } from './passwords.service';

const lowestCost = 4;
const passwords = new Passwords(lowestCost);

describe('kept passwords', () => {
  it('differ where the passwords differ only after the 72nd byte, where bcrypt itself stops reading', async () => {
    const long = 'a'.repeat(72);
    const kept = await passwords.keep(`${long}one`);
    expect(await passwords.fits(`${long}one`, kept)).toBe(true);
    expect(await passwords.fits(`${long}two`, kept)).toBe(false);
  });

  it('differ where the passwords differ only after a zero byte', async () => {
    const kept = await passwords.keep('before\u0000after');
    expect(await passwords.fits('before\u0000other', kept)).toBe(false);
  });

  it('are not bcrypt of the password as it was typed', async () => {
    const kept = await passwords.keep('seven brass hooks and eyes');
    expect(await compare('seven brass hooks and eyes', kept)).toBe(false);
  });

  it('fit however the letters were put together by the keyboard', async () => {
    const kept = await passwords.keep('Mélusine sews at night');
    expect(await passwords.fits('Me\u0301lusine sews at night', kept)).toBe(true);
  });

  it('fit nobody who does not exist', async () => {
    expect(await passwords.fits('seven brass hooks and eyes', null)).toBe(false);
  });

  it('cost a guess 2¹² rounds in a real house', async () => {
    expect(await new Passwords(passwordCost).keep('seven brass hooks and eyes')).toMatch(/^\$2b\$12\$/);
  });
});

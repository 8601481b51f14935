// Compiled by the type check, never run: each line below must not compile.
import Fraction from 'fraction.js';
import { addMoney, money, subtractMoney } from '#domain/money.ts';
import { addQuantities, compareQuantities, quantity, subtractQuantities } from '#domain/quantity.ts';

const pounds = money(100, 'GBP');
const dollars = money(100, 'USD');
addMoney(pounds, pounds);
// @ts-expect-error two currencies do not add
addMoney(pounds, dollars);
// @ts-expect-error nor subtract
subtractMoney(dollars, pounds);

const litre = quantity('volume', new Fraction(1000));
const kilo = quantity('mass', new Fraction(1000));
addQuantities(litre, litre);
// @ts-expect-error two dimensions do not add
addQuantities(litre, kilo);
// @ts-expect-error nor subtract
subtractQuantities(kilo, litre);
// @ts-expect-error nor compare
compareQuantities(litre, kilo);
// @ts-expect-error money is no quantity
addQuantities(litre, pounds);

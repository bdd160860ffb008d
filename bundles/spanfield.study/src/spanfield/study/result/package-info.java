/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/**
 * Results of a study run: immutable tables and the evidence that belongs to them. SI units throughout (tesla, metres, amperes);
 * phasors are RMS with time factor exp(+j omega t). Nothing here refers to the model that a result was computed from.
 */
package spanfield.study.result;

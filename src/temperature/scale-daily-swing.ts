const HALF_DAY = 43_200_000;

/**
 * A what-if: the same history with its swing about the mean of the 24 h around each sample made larger or smaller.
 * Seasons stay as they are; days keep their shape. Within half a day of either end the first or last 24 h serve.
 *
 * @param times [ms], rising
 * @param temperature [°C], straight between the times
 * @param factor 1 leaves it as it is, 0 leaves the mean
 */
export function scaleDailySwing(
  times: Float64Array,
  temperature: Float64Array,
  factor: number,
): Float64Array {
  const mean = meanOfDayAround(times, temperature);
  return temperature.map((value, i) => mean[i] + factor * (value - mean[i]));
}

function meanOfDayAround(times: Float64Array, values: Float64Array): Float64Array {
  const last = times.length - 1;
  const length = Math.min(2 * HALF_DAY, times[last] - times[0]);
  if (length === 0) return values.slice();
  const sum = integral(times, values);
  const integralTo = walkingIntegral(times, values, sum);
  const integralFrom = walkingIntegral(times, values, sum);
  return times.map((time) => {
    const start = Math.min(Math.max(time - HALF_DAY, times[0]), times[last] - length);
    return (integralTo(start + length) - integralFrom(start)) / length;
  });
}

/** ∫ from the first time to each time. */
function integral(times: Float64Array, values: Float64Array): Float64Array {
  const sum = new Float64Array(times.length);
  for (let i = 1; i < times.length; i++) {
    sum[i] = sum[i - 1] + ((values[i - 1] + values[i]) / 2) * (times[i] - times[i - 1]);
  }
  return sum;
}

/** ∫ from the first time to any time, asked for in rising order. */
function walkingIntegral(times: Float64Array, values: Float64Array, sum: Float64Array) {
  let k = 0;
  return (time: number): number => {
    while (k < times.length - 2 && times[k + 1] <= time) k++;
    const part = time - times[k];
    const slope = (values[k + 1] - values[k]) / (times[k + 1] - times[k]);
    return sum[k] + part * (values[k] + (slope * part) / 2);
  };
}

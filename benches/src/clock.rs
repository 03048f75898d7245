//! A stopwatch for calls of nanoseconds to seconds.

use std::hint::black_box;
use std::time::{Duration, Instant};

/// Time of one call: the median over batches, each batch long enough for the clock.
pub fn time<T>(mut call: impl FnMut() -> T) -> Duration {
    const BATCH: Duration = Duration::from_millis(4);
    const BATCHES: usize = 25;
    let mut calls = 1u32;
    loop {
        let took = batch(&mut call, calls);
        if took >= BATCH || calls > 1 << 20 {
            break;
        }
        calls *= 2;
    }
    let mut batches: Vec<Duration> = (0..BATCHES).map(|_| batch(&mut call, calls)).collect();
    batches.sort_unstable();
    batches[BATCHES / 2] / calls
}

fn batch<T>(call: &mut impl FnMut() -> T, calls: u32) -> Duration {
    let start = Instant::now();
    for _ in 0..calls {
        black_box(call());
    }
    start.elapsed()
}

/// Microseconds, for print.
#[must_use]
#[allow(clippy::float_arithmetic)]
pub fn microseconds(time: Duration) -> f64 {
    time.as_secs_f64() * 1e6
}

/// The geometric mean.
#[must_use]
pub fn geometric_mean(ratios: &[f64]) -> f64 {
    (ratios.iter().map(|ratio| ratio.ln()).sum::<f64>() / ratios.len() as f64).exp()
}

/// Peak memory of this process in kilobytes, where the system tells (Linux: `VmHWM`).
#[must_use]
pub fn peak_memory_kilobytes() -> Option<u64> {
    let status = std::fs::read_to_string("/proc/self/status").ok()?;
    let line = status.lines().find(|line| line.starts_with("VmHWM:"))?;
    line.split_whitespace().nth(1)?.parse().ok()
}

//! Sorting of short lists.

/// Sorts a short or nearly sorted list in place: an item moves before its neighbour while
/// `after(neighbour, item)`; equal items keep their order.
///
/// The time grows with the square of the length (a hundred items: some microseconds). The standard
/// library's sorts are better for long lists, but each kind of item costs 6 to 10 kB of WebAssembly
/// there, and 0.2 kB here.
///
/// ```
/// use shiftgauge::numeric::sort_short;
/// let mut roots = [812.0, 640.0, 705.0];
/// sort_short(&mut roots, |before, item| before > item);
/// assert_eq!(roots, [640.0, 705.0, 812.0]);
/// ```
pub fn sort_short<T>(items: &mut [T], after: impl Fn(&T, &T) -> bool) {
    for sorted in 1..items.len() {
        let mut at = sorted;
        while at > 0 && after(&items[at - 1], &items[at]) {
            items.swap(at - 1, at);
            at -= 1;
        }
    }
}

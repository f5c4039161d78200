//! Short lists in order.

/// Sorts a short list in place by insertion; equals keep their order.
///
/// The lists here have a handful of members. The standard library's sort is made for long ones and
/// takes some 8 kB of the download for each kind of member; this takes next to nothing.
///
/// ```
/// use shiftgauge::numeric::sort_short;
/// let mut words = ["mol", "kg", "mol", "bar"];
/// sort_short(&mut words, |a, b| a < b);
/// assert_eq!(words, ["bar", "kg", "mol", "mol"]);
/// ```
pub fn sort_short<T>(list: &mut [T], mut comes_before: impl FnMut(&T, &T) -> bool) {
    for end in 1..list.len() {
        let mut at = end;
        while at > 0 && comes_before(&list[at], &list[at - 1]) {
            list.swap(at, at - 1);
            at -= 1;
        }
    }
}

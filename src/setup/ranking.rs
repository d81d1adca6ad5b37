use core::cmp::Ordering;

/// Keeps the first of what is offered, by an order in which no two are equal, in a slice that may be shorter than
/// all of it: a heap with the last at its root, so that neither the order of the offers nor their number makes it slow.
pub(super) struct Ranking<'a, T> {
    places: &'a mut [T],
    taken: usize,
}

impl<'a, T: Copy> Ranking<'a, T> {
    pub(super) fn new(places: &'a mut [T]) -> Self {
        Ranking { places, taken: 0 }
    }

    pub(super) fn offer(&mut self, item: T, order: impl Fn(&T, &T) -> Ordering) {
        if self.taken < self.places.len() {
            self.rise(self.taken, item, order);
            self.taken += 1;
        } else if let Some(last) = self.places.first()
            && order(&item, last).is_lt()
        {
            self.sink(self.taken, item, order);
        }
    }

    /// Puts them into their order; how many they are.
    pub(super) fn finish(mut self, order: impl Fn(&T, &T) -> Ordering) -> usize {
        for end in (1..self.taken).rev() {
            if let (Some(&last), Some(&item)) = (self.places.first(), self.places.get(end)) {
                self.sink(end, item, &order);
                self.put(end, last);
            }
        }
        self.taken
    }

    /// Puts `item`, for which there is a hole, where it belongs on the way up from there.
    fn rise(&mut self, mut hole: usize, item: T, order: impl Fn(&T, &T) -> Ordering) {
        while hole > 0
            && let above = (hole - 1) / 2
            && let Some(&parent) = self.places.get(above)
            && order(&item, &parent).is_gt()
        {
            self.put(hole, parent);
            hole = above;
        }
        self.put(hole, item);
    }

    /// Takes the root's place for `item`: its hole sinks to the end of the heap first, since an item from there rarely
    /// rises far, which saves half of the comparisons.
    fn sink(&mut self, end: usize, item: T, order: impl Fn(&T, &T) -> Ordering) {
        let mut hole = 0;
        loop {
            let below = 2 * hole + 1;
            let Some(&left) = self.places.get(below).filter(|_| below < end) else { break };
            match self.places.get(below + 1) {
                Some(&right) if below + 1 < end && order(&right, &left).is_gt() => {
                    self.put(hole, right);
                    hole = below + 1;
                }
                _ => {
                    self.put(hole, left);
                    hole = below;
                }
            }
        }
        self.rise(hole, item, order);
    }

    fn put(&mut self, at: usize, item: T) {
        if let Some(place) = self.places.get_mut(at) {
            *place = item;
        }
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use proptest::prelude::*;

    proptest! {
        #[test]
        fn first_ones_in_order(mut items in prop::collection::vec(any::<u16>(), 0..200), room in 0_usize..200) {
            let mut places = std::vec![0; room];
            let mut ranking = Ranking::new(&mut places);
            for &item in &items {
                ranking.offer(item, u16::cmp);
            }
            let taken = ranking.finish(u16::cmp);
            items.sort_unstable();
            items.truncate(room);
            prop_assert_eq!(&places[..taken], &items[..]);
        }
    }
}

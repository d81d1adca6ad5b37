/// A focuser, and the tube whose length moves the focus. Any values can be used.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
#[repr(C)]
pub struct Focuser {
    /// Member 1. Travel of one step of the motor, nanometres; 0: unknown.
    pub motor_step_nm: u32,
    /// Member 2. The distance from the best focus that is asked about, nanometres; 0 is in focus.
    pub defocus_nm: u32,
    /// Member 3. Length that grows with the temperature between the objective and the focus, micrometres; 0:
    /// unknown.
    pub tube_length_um: u32,
    /// Member 4. Its thermal expansion, parts per billion per kelvin; 0: unknown.
    pub expansion_ppb_per_k: u32,
}

mod decimal;
mod equipment;
mod table;
fn main() {
    let e = equipment::Equipment::read(&std::fs::read_to_string(std::env::args().nth(1).unwrap()).unwrap());
    match e {
        Ok(e) => println!(
            "{} {:?} {:?} {:?} {:?}",
            e.school, e.observer, e.telescopes[0].item, e.eyepieces[1].item, e.camera.item
        ),
        Err(e) => println!("{e}"),
    }
}

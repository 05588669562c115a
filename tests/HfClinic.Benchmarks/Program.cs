Console.WriteLine("no measure yet");
